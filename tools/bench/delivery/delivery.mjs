// Delivery from HTTP to committed rows, against a bare insert of the same bytes and against PouchDB to express-pouchdb, in the
// same run on the same machine. Prints ratios beside their limits; ends with 1 when a limit is missed.
import { readFileSync } from 'node:fs';
import { chmod, mkdtemp, rm } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { build } from '../../lib/build.mjs';
import { readSecrets } from '../../lib/secrets.mjs';
import { startCluster } from '../../postgres/cluster.mjs';
import { startProduct } from '../../product/product.mjs';
import { makeChains } from './chains.mjs';
import { enrol, makeCompany } from './company.mjs';
import { measurePhones } from './phones.mjs';
import { measurePouch } from './pouch.mjs';
import { measureRaw } from './raw-insert.mjs';

const { Client } = createRequire(import.meta.url)('pg');
const entries = Number(process.env.BENCH_ENTRIES ?? 10_000);
const rounds = Number(process.env.BENCH_ROUNDS ?? 3);
const batch = 100;
const limits = { raw: 0.35, pouch: 3, memoryMb: 250 };

const middle = (values) => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)];
const peakMb = (pid) => Number(/VmHWM:\s+(\d+)/.exec(readFileSync(`/proc/${pid}/status`, 'utf8'))[1]) / 1_024;

/** Waits until everything that was delivered has been projected too. */
async function projected(admin) {
  for (;;) {
    const { rows } = await admin.query('select count(*)::int as waiting from stale_projections');
    if (rows[0].waiting === 0) return;
    await new Promise((resolve) => setTimeout(resolve, 250));
  }
}

await build(['api']);
// PostgreSQL may run as another user, who has to enter it.
const dataDir = await mkdtemp(join(tmpdir(), 'rimeward-bench-delivery-'));
await chmod(dataDir, 0o755);
const cluster = await startCluster({ dataDir, superPassword: readSecrets(dataDir).superPassword });
const product = await startProduct({ adminUrl: cluster.adminUrl, dataDir, databaseName: 'bench' });
const admin = new Client({ connectionString: product.adminDatabaseUrl });
await admin.connect();
try {
  const rates = { raw: [], pouch: [], one: [], fifty: [] };
  for (let round = 0; round <= rounds; round += 1) {
    const office = await makeCompany(admin, Math.ceil(entries / 60));
    const chains = {
      company: office.company,
      actor: office.actor,
      visits: office.visits,
      entries,
    };
    const one = makeChains({ ...chains, phones: 1 });
    const fifty = makeChains({ ...chains, phones: 50 });
    await enrol(admin, office, [...one, ...fifty]);
    const measured = {
      pouch: await measurePouch(one[0].texts, batch),
      raw: await measureRaw(admin, office, one[0], batch),
    };
    // What is delivered is projected a while later: no figure is taken meanwhile.
    measured.one = await measurePhones({ origin: product.origin, phones: one, batch });
    await projected(admin);
    measured.fifty = await measurePhones({ origin: product.origin, phones: fifty, batch });
    await projected(admin);
    const { rows } = await admin.query(
      'select count(*)::int as stored, avg(length(bytes))::int as bytes from log_entries where company_id = $1',
      [office.company],
    );
    if (rows[0].stored !== entries * 2) throw new Error(`${rows[0].stored} rows stored of ${entries * 2}`);
    // The first round warms everything up.
    if (round > 0) for (const name of Object.keys(rates)) rates[name].push(measured[name]);
    if (round === 0)
      console.log(
        `${entries} entries of ${rows[0].bytes} bytes, batches of ${batch}, ${rounds} rounds, medians.`,
      );
  }
  const memoryMb = peakMb(product.apiPid);
  const { raw, pouch, one, fifty } = Object.fromEntries(
    Object.entries(rates).map(([name, values]) => [name, middle(values)]),
  );
  console.log(`raw multi-row insert   ${Math.round(raw)}/s`);
  console.log(`PouchDB replication    ${Math.round(pouch)}/s`);
  console.log(`one phone              ${Math.round(one)}/s`);
  console.log(`50 phones              ${Math.round(fifty)}/s`);
  const checks = [
    ['one phone against raw insert', one / raw, '>=', limits.raw],
    ['50 phones against raw insert', fifty / raw, '>=', limits.raw],
    ['one phone against PouchDB', one / pouch, '>=', limits.pouch],
    ['50 phones against PouchDB', fifty / pouch, '>=', limits.pouch],
    ['memory of the API, MB at its highest', memoryMb, '<', limits.memoryMb],
  ];
  for (const [what, value, sense, limit] of checks) {
    const met = sense === '<' ? value < limit : value >= limit;
    if (!met) process.exitCode = 1;
    console.log(`${met ? 'met   ' : 'MISSED'} ${what}: ${value.toFixed(2)} (limit ${sense} ${limit})`);
  }
} finally {
  await admin.end();
  await product.discard();
  await cluster.stop();
  await rm(dataDir, { recursive: true, force: true });
}
