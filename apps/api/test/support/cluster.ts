import { execFileSync, spawn, type ChildProcess } from 'node:child_process';
import { chownSync, existsSync, mkdtempSync, readdirSync, rmSync } from 'node:fs';
import { createServer } from 'node:net';
import { join } from 'node:path';
import { Client } from 'pg';

export interface Cluster {
  adminUrl: string;
  stop: () => Promise<void>;
}

/** A throw-away PostgreSQL on loopback for a test run that was started without one. */
export async function startCluster(): Promise<Cluster> {
  const bin = binaries();
  const owner = process.getuid?.() === 0 ? { uid: idOf('-u'), gid: idOf('-g') } : {};
  const folder = mkdtempSync('/tmp/rimeward-test-');
  if (owner.uid !== undefined && owner.gid !== undefined) chownSync(folder, owner.uid, owner.gid);
  const data = join(folder, 'data');
  execFileSync(
    join(bin, 'initdb'),
    ['-D', data, '-U', 'postgres', '--auth=trust', '-E', 'UTF8', '--no-sync'],
    {
      ...owner,
      stdio: 'ignore',
    },
  );
  const port = await freePort();
  const settings = [
    'fsync=off',
    'listen_addresses=127.0.0.1',
    `port=${port}`,
    'unix_socket_directories=',
    'max_connections=200',
  ];
  const server = spawn(join(bin, 'postgres'), ['-D', data, ...settings.flatMap((one) => ['-c', one])], {
    ...owner,
    stdio: 'ignore',
  });
  const adminUrl = `postgres://postgres@127.0.0.1:${port}/postgres`;
  await answering(adminUrl, server);
  return {
    adminUrl,
    stop: async () => {
      const gone = new Promise((resolve) => server.once('exit', resolve));
      server.kill('SIGINT');
      await gone;
      rmSync(folder, { recursive: true, force: true });
    },
  };
}

function binaries(): string {
  const root = '/usr/lib/postgresql';
  const versions = existsSync(root) ? readdirSync(root).sort((a, b) => Number(b) - Number(a)) : [];
  const found = versions
    .map((version) => join(root, version, 'bin'))
    .find((bin) => existsSync(join(bin, 'initdb')));
  if (!found) throw new Error('PostgreSQL is missing: apt-get install postgresql');
  return found;
}

function idOf(flag: '-u' | '-g'): number {
  return Number(execFileSync('id', [flag, 'postgres'], { encoding: 'utf8' }));
}

function freePort(): Promise<number> {
  return new Promise((resolve, reject) => {
    const probe = createServer();
    probe.once('error', reject);
    probe.listen(0, '127.0.0.1', () => {
      const address = probe.address();
      probe.close(() =>
        typeof address === 'object' && address ? resolve(address.port) : reject(new Error('no port')),
      );
    });
  });
}

async function answering(url: string, server: ChildProcess): Promise<void> {
  for (let tries = 0; tries < 100; tries += 1) {
    if (server.exitCode !== null) throw new Error('PostgreSQL stopped while starting');
    const client = new Client({ connectionString: url });
    try {
      await client.connect();
      await client.end();
      return;
    } catch {
      await new Promise((resolve) => setTimeout(resolve, 100));
    }
  }
  throw new Error('PostgreSQL does not answer');
}
