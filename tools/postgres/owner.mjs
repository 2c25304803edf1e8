import { execFileSync, spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { chownSync, mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { say } from '../lib/say.mjs';

/** PostgreSQL does not run as root: as root it runs as its own system user, else as ourselves. */
export function postgresOwner() {
  if (process.getuid?.() !== 0) return null;
  const id = (flag) => Number(execFileSync('id', [flag, 'postgres'], { encoding: 'utf8' }));
  return { uid: id('-u'), gid: id('-g') };
}

/**
 * The folder for the cluster: inside the data folder, or beside the system's own data when PostgreSQL's user cannot walk there
 * (a clone under /root).
 */
export function clusterFolder(dataDir, owner) {
  const inside = join(dataDir, 'postgres');
  mkdirSync(inside, { recursive: true, mode: 0o700 });
  if (!owner) return inside;
  chownSync(inside, owner.uid, owner.gid);
  if (spawnSync('ls', [inside], { ...owner, stdio: 'ignore' }).status === 0) return inside;
  const name = createHash('sha256').update(inside).digest('hex').slice(0, 12);
  const outside = join('/var/lib', `rimeward-${name}`);
  mkdirSync(outside, { recursive: true, mode: 0o700 });
  chownSync(outside, owner.uid, owner.gid);
  say(`The user of PostgreSQL cannot enter ${dataDir}; its data is kept in ${outside}.`);
  return outside;
}
