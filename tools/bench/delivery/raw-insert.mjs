import { createHash } from 'node:crypto';

/**
 * Rows a second of a bare multi-row insert with `pg`: the same bytes, the same copy for queries, the same columns, keys and
 * indexes as the log, one transaction a batch; no HTTP, no JSON to read, no chain, no policies.
 */
export async function measureRaw(admin, { company, actor }, { device, texts }, batch) {
  await admin.query('drop table if exists raw_log');
  await admin.query('create table raw_log (like log_entries including all)');
  const rows = texts.map((text, index) => {
    const entry = JSON.parse(text);
    const hash = createHash('sha256').update(text).digest();
    const prev = Buffer.from(entry.prev, 'hex');
    const { id, visit, type } = entry;
    return [
      company,
      index + 1,
      device,
      index + 1,
      prev,
      hash,
      Buffer.from(text),
      text,
      id,
      visit,
      actor,
      type,
      null,
    ];
  });
  const columns = rows[0].length;
  const start = performance.now();
  for (let at = 0; at < rows.length; at += batch) {
    const some = rows.slice(at, at + batch);
    const places = some.map(
      (row, n) => `(${row.map((_, column) => `$${n * columns + column + 1}`).join(',')}, now())`,
    );
    await admin.query(
      `insert into raw_log (company_id, position, device_id, seq, prev, hash, bytes, entry, entry_id, visit_id, actor_id, type,
         held_reason, received_at) values ${places.join(',')}`,
      some.flat(),
    );
  }
  const perSecond = rows.length / ((performance.now() - start) / 1_000);
  await admin.query('drop table raw_log');
  return perSecond;
}
