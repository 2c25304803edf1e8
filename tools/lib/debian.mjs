import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { Fault, say } from './say.mjs';
import { runShown } from './processes.mjs';

/** Installs a Debian package where we may, else says the command that does it. */
export async function installPackage(name, reason) {
  const command = `apt-get install -y ${name}`;
  const isRoot = process.getuid?.() === 0;
  const sudo = !isRoot && existsSync('/usr/bin/sudo') && spawnSync('sudo', ['-n', 'true']).status === 0;
  if (!existsSync('/usr/bin/apt-get') || (!isRoot && !sudo)) {
    throw new Fault(`${reason} is missing. Install it with: sudo ${command}`);
  }
  say(`${reason} is missing: installing the Debian package ${name}.`);
  const prefix = isRoot ? [] : ['sudo', '-n'];
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  for (const args of [
    ['apt-get', 'update', '-qq'],
    ['apt-get', 'install', '-y', '-qq', '--no-install-recommends', name],
  ]) {
    const [first, ...rest] = [...prefix, ...args];
    const code = await runShown(first, rest, { env, stdio: ['ignore', 'ignore', 'inherit'] });
    if (code !== 0 && args[1] === 'install')
      throw new Fault(`${reason} could not be installed. Try: sudo ${command}`);
  }
}
