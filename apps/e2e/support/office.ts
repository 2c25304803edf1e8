import { randomBytes } from 'node:crypto';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { startProduct, type Product } from '../../../tools/product/product.mjs';

export interface Office {
  product: Product;
  account: (name: string) => { email: string; password: string };
  close: () => Promise<void>;
}

/** The built product with the demo company, on the throw-away cluster of the test run. */
export async function openOffice(name: string): Promise<Office> {
  const adminUrl = process.env['TEST_POSTGRES_ADMIN_URL'];
  if (!adminUrl)
    throw new Error('TEST_POSTGRES_ADMIN_URL is not set: run the browser tests with "npm test -- browser"');
  const dataDir = mkdtempSync(join(process.env['TEST_WORK_DIR'] ?? tmpdir(), 'office-'));
  const product = await startProduct({
    adminUrl,
    dataDir,
    databaseName: `browser_${name}_${randomBytes(4).toString('hex')}`,
    seedDemo: true,
  });
  return {
    product,
    account: (person) => {
      const found = product.accounts.find((one) => one.name.startsWith(person));
      if (!found) throw new Error(`The demo has nobody called ${person}`);
      return found;
    },
    close: async () => {
      await product.discard();
      rmSync(dataDir, { recursive: true, force: true });
    },
  };
}
