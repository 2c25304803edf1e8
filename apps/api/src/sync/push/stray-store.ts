import type { EntityManager } from 'typeorm';
import type { StrayEntry } from './place-entries';
import { companySetting as company } from '../../database/protect-table';

/** Keeps entries that have no place in the chain, each once, however often they are sent. The chain's lock must be held. */
export async function keepStrays(
  manager: EntityManager,
  device: string,
  strays: readonly StrayEntry[],
): Promise<number> {
  const unseen = await notYetKept(manager, device, strays);
  if (unseen.length === 0) return 0;
  const rows = await manager.query<{ position: string }[]>(
    `with taken as (
       insert into company_positions (company_id, position) values (${company}, $1::bigint)
       on conflict (company_id) do update set position = company_positions.position + excluded.position
       returning company_id, position - $1::bigint as base
     )
     insert into stray_entries (company_id, position, device_id, seq, hash, bytes, visit_id, held_reason, received_at)
     select taken.company_id, taken.base + r.n, $2::uuid, r.seq, r.hash, r.bytes, r.visit_id, r.held_reason, clock_timestamp()
     from taken, unnest($3::int[], $4::bytea[], $5::bytea[], $6::uuid[], $7::text[]) with ordinality
       as r (seq, hash, bytes, visit_id, held_reason, n)
     returning position`,
    [
      unseen.length,
      device,
      unseen.map(({ seq }) => seq),
      unseen.map(({ entry }) => Buffer.from(entry.hash, 'hex')),
      unseen.map(({ entry }) => entry.bytes),
      unseen.map(({ entry }) => entry.visit),
      unseen.map(({ heldReason }) => heldReason),
    ],
  );
  if (rows.length !== unseen.length) throw new Error('held entries were not written');
  return rows.length;
}

/** An unreadable entry may also stand in the chain already, when an earlier batch told its number. */
async function notYetKept(
  manager: EntityManager,
  device: string,
  strays: readonly StrayEntry[],
): Promise<StrayEntry[]> {
  const once = [...new Map(strays.map((stray) => [keyOf(stray.seq, stray.entry.hash), stray])).values()];
  if (once.length === 0) return [];
  const hashes = once.map(({ entry }) => Buffer.from(entry.hash, 'hex'));
  const kept = await manager.query<{ seq: number; hash: string }[]>(
    `select seq, encode(hash, 'hex') as hash from stray_entries
       where company_id = ${company} and device_id = $1 and hash = any($2::bytea[])
     union all
     select 0, encode(hash, 'hex') from log_entries
       where company_id = ${company} and device_id = $1 and held_reason = 'unreadable' and hash = any($2::bytea[])`,
    [device, hashes],
  );
  const known = new Set(kept.map((row) => keyOf(row.seq, row.hash)));
  return once.filter(({ seq, entry }) => !known.has(keyOf(seq, entry.hash)));
}

function keyOf(seq: number, hash: string): string {
  return `${seq} ${hash}`;
}
