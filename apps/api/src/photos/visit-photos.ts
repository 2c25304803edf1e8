import type { PhotoRecord } from '@rimeward/contracts';
import type { EntityManager } from 'typeorm';
import { companySetting as company } from '../database/protect-table';

interface Row {
  sha256: string;
  bytes: string;
  type: string;
  complete: boolean;
  has_preview: boolean;
  exif: Record<string, unknown> | null;
  also: string[];
}

/** Every photograph that entries of a visit name, whether it is here or not, and where else the same content was used. */
export async function photosOfVisit(manager: EntityManager, visitId: string): Promise<PhotoRecord[]> {
  const rows = await manager.query<Row[]>(
    `select named.sha256, coalesce(p.bytes, named.bytes)::text as bytes, coalesce(p.type, named.type) as type,
       coalesce(p.state = 'complete', false) as complete, coalesce(p.has_preview, false) as has_preview, p.exif,
       array(select distinct r.visit_id::text from photo_references r
         where r.company_id = ${company} and r.sha256 = named.sha256 and r.visit_id <> $1 order by 1) as also
     from (
       select sha256, max(bytes) as bytes, max(type) as type, min(position) as first
       from photo_references where company_id = ${company} and visit_id = $1 group by sha256
     ) named
     left join photos p on p.company_id = ${company} and p.sha256 = named.sha256
     order by named.first, named.sha256`,
    [visitId],
  );
  return rows.map((row) => ({
    sha256: row.sha256,
    bytes: Number(row.bytes),
    type: row.type,
    complete: row.complete,
    hasPreview: row.has_preview,
    exif: row.exif,
    alsoOnVisits: row.also,
  }));
}
