import { generateKeyPairSync, randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';

/** Passwords and keys of one data folder, made once and readable by us alone. */
export function readSecrets(dataDir) {
  mkdirSync(dataDir, { recursive: true });
  const file = join(dataDir, 'secrets.json');
  if (!existsSync(file)) {
    const random = () => randomBytes(32).toString('base64url');
    const secrets = {
      superPassword: random(),
      passwords: { migrator: random(), app: random() },
      sessionSecret: random(),
    };
    writeFileSync(file, JSON.stringify(secrets, null, 2), { mode: 0o600 });
  }
  const signingKeyFile = join(dataDir, 'signing-key.pem');
  if (!existsSync(signingKeyFile)) {
    const { privateKey } = generateKeyPairSync('ec', { namedCurve: 'P-256' });
    writeFileSync(signingKeyFile, privateKey.export({ type: 'pkcs8', format: 'pem' }), { mode: 0o600 });
  }
  return { ...JSON.parse(readFileSync(file, 'utf8')), signingKeyFile };
}
