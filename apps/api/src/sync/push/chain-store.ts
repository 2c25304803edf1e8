import type { HeldReason, Manifest } from '@rimeward/contracts';
import { noPrevious } from '@rimeward/delivery';
import type { EntityManager } from 'typeorm';
import type { ChainHead, KnownEntry, PlacedEntry } from './place-entries';
import { markStaleSql } from '../feed/stale-sql';
import { copyable } from './copyable';
import { missingPhotosSql } from './photo-references';
import { companySetting as company } from '../../database/protect-table';

export interface LockedChain extends ChainHead {
  /** Photographs that stored entries name and the office does not have. */
  missing: string[];
}

/** Locks a device's chain until the transaction ends, keeps what the phone tells of itself, and reads where it stands. */
export async function lockChain(
  manager: EntityManager,
  device: string,
  manifest: Manifest,
): Promise<LockedChain> {
  const rows = await manager.query<LockedChain[]>(
    `insert into device_chains (company_id, device_id, seq, hash, manifest, last_contact_at)
     values (${company}, $1, 0, decode($2, 'hex'), $3, clock_timestamp())
     on conflict (company_id, device_id)
       do update set manifest = excluded.manifest, last_contact_at = excluded.last_contact_at
     returning seq, encode(hash, 'hex') as hash, array(${missingPhotosSql}) as missing`,
    [device, noPrevious, JSON.stringify(manifest)],
  );
  const head = rows[0];
  if (head === undefined) throw new Error('the chain of a device could not be locked');
  return head;
}

/** What the office has of a device between two sequence numbers. */
export async function knownEntries(
  manager: EntityManager,
  device: string,
  fromSeq: number,
  toSeq: number,
): Promise<Map<number, KnownEntry>> {
  if (fromSeq > toSeq) return new Map();
  const rows = await manager.query<{ seq: number; hash: string; held_reason: HeldReason | null }[]>(
    `select seq, encode(hash, 'hex') as hash, held_reason from log_entries
     where company_id = ${company} and device_id = $1 and seq between $2 and $3`,
    [device, fromSeq, toSeq],
  );
  return new Map(rows.map((row) => [row.seq, { hash: row.hash, heldReason: row.held_reason }]));
}

/**
 * One statement: marks the visits' copies as stale, then takes positions under the company's counter, writes the rows, moves
 * the chain's head. The bytes travel as one binary value and are cut apart by the database, so that they arrive unescaped.
 */
const appendSql = `
  with stale as (
    ${markStaleSql('$16')} returning visit_id
  ), taken as (
    insert into company_positions (company_id, position)
    select ${company}, $1::bigint where (select count(*) from stale) >= 0
    on conflict (company_id) do update set position = company_positions.position + excluded.position
    returning company_id, position - $1::bigint as base
  ), written as (
    insert into log_entries (company_id, position, device_id, seq, prev, hash, bytes, entry, entry_id, visit_id,
      actor_id, type, held_reason, received_at)
    select taken.company_id, taken.base + r.n, $2::uuid, r.seq,
      substring($3::bytea from (r.n::int - 1) * 64 + 1 for 32), substring($3::bytea from (r.n::int - 1) * 64 + 33 for 32),
      substring($4::bytea from r.start for r.length),
      case when r.copy then convert_from(substring($4::bytea from r.start for r.length), 'UTF8')::jsonb end,
      r.entry_id, r.visit_id, r.actor_id, r.type, r.held_reason, clock_timestamp()
    from taken, unnest($5::int[], $6::int[], $7::int[], $8::boolean[], $9::uuid[], $10::uuid[], $11::uuid[],
      $12::text[], $13::text[]) with ordinality
      as r (seq, start, length, copy, entry_id, visit_id, actor_id, type, held_reason, n)
    returning position, seq, encode(hash, 'hex') as hash
  ), moved as (
    update device_chains set seq = $14, hash = decode($15, 'hex') where company_id = ${company} and device_id = $2
    returning device_id
  )
  select position, seq, hash from written where exists (select from moved)`;

/**
 * Appends to a chain whose lock is held and reads back what was written.
 *
 * @returns position of each entry, in order
 */
export async function appendEntries(
  manager: EntityManager,
  device: string,
  placed: readonly PlacedEntry[],
  head: ChainHead,
  visits: readonly string[],
): Promise<number[]> {
  let start = 1;
  const starts = placed.map(({ entry }) => (start += entry.bytes.length) - entry.bytes.length);
  const rows = await manager.query<{ position: string; seq: number; hash: string }[]>(appendSql, [
    placed.length,
    device,
    Buffer.concat(
      placed.flatMap(({ entry }) => [Buffer.from(entry.prev, 'hex'), Buffer.from(entry.hash, 'hex')]),
    ),
    Buffer.concat(placed.map(({ entry }) => entry.bytes)),
    placed.map(({ seq }) => seq),
    starts,
    placed.map(({ entry }) => entry.bytes.length),
    placed.map(({ entry, heldReason }) => heldReason === null && copyable(entry.bytes)),
    placed.map(({ entry }) => entry.header?.id ?? null),
    placed.map(({ entry }) => entry.visit),
    placed.map(({ entry }) => entry.actor),
    placed.map(({ entry }) => entry.type),
    placed.map(({ heldReason }) => heldReason),
    head.seq,
    head.hash,
    visits,
  ]);
  const written = new Map(rows.map((row) => [row.seq, row]));
  return placed.map(({ seq, entry }) => {
    const row = written.get(seq);
    if (row?.hash !== entry.hash) throw new Error(`entry ${seq} of device ${device} was not written as sent`);
    return Number(row.position);
  });
}
