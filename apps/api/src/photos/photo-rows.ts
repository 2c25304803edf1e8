import type { EntityManager } from 'typeorm';
import type { AnnounceRequest, PhotoType } from '@rimeward/contracts';
import { companySetting as company } from '../database/protect-table';

export interface PhotoRow {
  sha256: string;
  bytes: number;
  type: PhotoType;
  state: 'partial' | 'complete' | 'refused';
  refused_because: string | null;
  has_preview: boolean;
  exif: Record<string, unknown> | null;
}

/** Largest size that the column holds; anything near it is refused anyway. */
const mostBytes = 2_147_483_647;

const columns = 'sha256, bytes, type, state, refused_because, has_preview, exif';

export async function photoRows(manager: EntityManager, sha256s: readonly string[]): Promise<PhotoRow[]> {
  return manager.query<PhotoRow[]>(
    `select ${columns} from photos where company_id = ${company} and sha256 = any($1::text[])`,
    [sha256s],
  );
}

/** Later announcements correct the size of what is not complete; the hash of the whole decides in the end. */
export async function announceRows(
  manager: EntityManager,
  photos: (AnnounceRequest['photos'][number] & { refusedBecause: string | null })[],
): Promise<void> {
  await manager.query(
    `insert into photos (company_id, sha256, bytes, type, state, refused_because)
     select ${company}, p.sha256, p.bytes, p.type, case when p.refused is null then 'partial' else 'refused' end, p.refused
     from jsonb_to_recordset($1::jsonb) as p (sha256 text, bytes int, type text, refused text)
     order by p.sha256
     on conflict (company_id, sha256) do update
       set bytes = excluded.bytes, type = excluded.type, state = excluded.state, refused_because = excluded.refused_because
       where (photos.state = 'partial' or photos.refused_because = 'photo-too-large') and photos.bytes <> excluded.bytes`,
    [
      JSON.stringify(
        photos.map(({ sha256, bytes, type, refusedBecause }) => ({
          sha256,
          bytes: Math.min(bytes, mostBytes),
          type,
          refused: refusedBecause,
        })),
      ),
    ],
  );
}

export async function completeRow(
  manager: EntityManager,
  sha256: string,
  type: PhotoType,
  exif: Record<string, string | number> | null,
): Promise<void> {
  await changeOne(
    manager,
    `update photos set state = 'complete', type = $2, exif = $3, refused_because = null, completed_at = clock_timestamp()
     where company_id = ${company} and sha256 = $1`,
    [sha256, type, exif === null ? null : JSON.stringify(exif)],
  );
}

export async function refuseRow(manager: EntityManager, sha256: string, because: string): Promise<void> {
  await changeOne(
    manager,
    `update photos set state = 'refused', refused_because = $2 where company_id = ${company} and sha256 = $1`,
    [sha256, because],
  );
}

export async function previewRow(manager: EntityManager, sha256: string): Promise<void> {
  await changeOne(
    manager,
    `update photos set has_preview = true where company_id = ${company} and sha256 = $1`,
    [sha256],
  );
}

async function changeOne(manager: EntityManager, sql: string, parameters: unknown[]): Promise<void> {
  const [, affected] = await manager.query<[unknown[], number]>(sql, parameters);
  if (affected !== 1) throw new Error('a photograph that was to change is not there');
}
