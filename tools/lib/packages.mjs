import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { root } from './paths.mjs';
import { runShown } from './processes.mjs';
import { Fault, say } from './say.mjs';

const marker = join(root, 'node_modules', '.rimeward-lock');

/** The Node.js that the lock file was made for. */
export function checkNode() {
  const [major, minor] = process.versions.node.split('.').map(Number);
  if (major !== 20 || minor < 19) {
    throw new Fault(`Rimeward needs Node.js 20.19 or newer within 20; this is ${process.versions.node}.`);
  }
}

/** Installs the packages of the lock file, unless exactly these are there already. */
export async function installPackages() {
  const lock = createHash('sha256')
    .update(readFileSync(join(root, 'package-lock.json')))
    .digest('hex');
  if (existsSync(marker) && readFileSync(marker, 'utf8') === lock) return;
  say('Installing the packages of the lock file.');
  const code = await runShown('npm', ['ci', '--no-audit', '--no-fund', '--loglevel=error'], { cwd: root });
  if (code !== 0) throw new Fault('npm ci failed; its own message stands above.');
  writeFileSync(marker, lock);
}
