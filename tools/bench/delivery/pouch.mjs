import { fork } from 'node:child_process';
import { once } from 'node:events';
import { mkdtemp, rm } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

const require = createRequire(import.meta.url);

/**
 * Documents a second that PouchDB replicates to express-pouchdb, both on LevelDB, the server in its own process. The
 * documents are in the local database before the clock starts, as our entries are sealed before it starts.
 */
export async function measurePouch(entries, batch) {
  const folder = await mkdtemp(join(tmpdir(), 'bench-pouch-'));
  const server = fork(new URL('./pouch-server.cjs', import.meta.url), [folder], {
    stdio: ['ignore', 'ignore', 'inherit', 'ipc'],
  });
  try {
    const [{ port }] = await once(server, 'message');
    const PouchDB = require('pouchdb');
    const local = new PouchDB(join(folder, 'phone'));
    for (let at = 0; at < entries.length; at += 1_000) {
      await local.bulkDocs(
        entries.slice(at, at + 1_000).map((text) => ({ _id: JSON.parse(text).id, entry: JSON.parse(text) })),
      );
    }
    const office = new PouchDB(`http://127.0.0.1:${port}/office`);
    await office.info();
    const start = performance.now();
    await local.replicate.to(office, { batch_size: batch });
    const perSecond = entries.length / ((performance.now() - start) / 1_000);
    const { doc_count: arrived } = await office.info();
    if (arrived !== entries.length) throw new Error(`${arrived} of ${entries.length} documents arrived`);
    await local.close();
    return perSecond;
  } finally {
    server.kill();
    await rm(folder, { recursive: true, force: true });
  }
}
