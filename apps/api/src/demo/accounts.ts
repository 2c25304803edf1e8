import { mkdirSync, renameSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { demoPeople } from './world/people';

/** Writes who can sign in to the demo, for the launcher to print. */
export function writeAccounts(dataDir: string): void {
  const accounts = demoPeople.map(({ role, name, email, password }) => ({ role, name, email, password }));
  mkdirSync(dataDir, { recursive: true });
  const file = join(dataDir, 'demo-accounts.json');
  writeFileSync(`${file}.new`, `${JSON.stringify(accounts, null, 2)}\n`, { mode: 0o600 });
  renameSync(`${file}.new`, file);
}
