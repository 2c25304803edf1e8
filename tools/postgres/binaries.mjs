import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { installPackage } from '../lib/debian.mjs';
import { Fault } from '../lib/say.mjs';

const versionsFolder = '/usr/lib/postgresql';

/** The folder with initdb and postgres, newest version first; installs Debian's package when there is none. */
export async function postgresBinaries() {
  const found = installed();
  if (found) return found;
  await installPackage('postgresql', 'PostgreSQL');
  const now = installed();
  if (!now)
    throw new Fault('PostgreSQL was installed, but its programs were not found under /usr/lib/postgresql.');
  return now;
}

function installed() {
  const folders = existsSync(versionsFolder) ? readdirSync(versionsFolder) : [];
  return folders
    .filter((name) => Number(name) >= 14)
    .sort((one, other) => Number(other) - Number(one))
    .map((name) => join(versionsFolder, name, 'bin'))
    .find((bin) => existsSync(join(bin, 'initdb')) && existsSync(join(bin, 'postgres')));
}
