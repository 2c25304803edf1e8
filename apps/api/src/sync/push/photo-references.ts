import { photoTypes, type PhotoType } from '@rimeward/contracts';
import type { EntityManager } from 'typeorm';
import type { PlacedEntry } from './place-entries';
import { companySetting as company } from '../../database/protect-table';

/**
 * Notes which entry names which photograph, for held entries too: their evidence is fetched like any other.
 *
 * @returns whether there was any
 */
export async function referPhotos(
  manager: EntityManager,
  device: string,
  placed: readonly PlacedEntry[],
  positions: readonly number[],
): Promise<boolean> {
  const references = placed.flatMap(({ entry }, index) =>
    [...new Map(entry.photos.map((photo) => [photo.sha256, photo])).values()].map(
      ({ sha256, bytes, type }) => ({
        sha256,
        bytes,
        type: photoTypes.includes(type as PhotoType) ? type : 'application/octet-stream',
        position: positions[index],
        visit_id: entry.visit,
      }),
    ),
  );
  if (references.length === 0) return false;
  await manager.query(
    `insert into photo_references (company_id, sha256, position, device_id, visit_id, bytes, type)
     select ${company}, sha256, position, $1, visit_id, bytes, type
     from jsonb_to_recordset($2::jsonb) as r (sha256 text, position bigint, visit_id uuid, bytes bigint, type text)`,
    [device, JSON.stringify(references)],
  );
  return true;
}

/** Photographs that stored entries of device $1 name and the office does not have: oldest first, a round's worth. */
export const missingPhotosSql = `
  select r.sha256 from photo_references r
  left join photos p on p.company_id = r.company_id and p.sha256 = r.sha256
  where r.company_id = ${company} and r.device_id = $1 and (p.state is null or p.state = 'partial')
  group by r.sha256 order by min(r.position) limit 500`;

/** The same, after this transaction has named more. */
export async function missingPhotos(manager: EntityManager, device: string): Promise<string[]> {
  const rows = await manager.query<{ sha256: string }[]>(missingPhotosSql, [device]);
  return rows.map((row) => row.sha256);
}
