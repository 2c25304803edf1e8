import type { DataSource } from 'typeorm';

/**
 * Part of every restore: positions given out after the backup will be given out again, so each phone must begin its reading
 * anew. What phones have not yet delivered, or have delivered since the backup, they send again by themselves.
 */
export async function renewEpoch(dataSource: DataSource): Promise<string> {
  const [, affected] = await dataSource.query<[unknown[], number]>(
    'update feed_epoch set epoch = gen_random_uuid()',
  );
  if (affected !== 1) throw new Error('the feed has no epoch to renew');
  return 'The feed has a new epoch: every phone reads it from the beginning.';
}
