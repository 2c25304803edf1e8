import { randomBytes } from 'node:crypto';
import { startCluster, type Cluster } from './cluster';
import { makeTemplate } from './database';

declare global {
  var rimewardCluster: Cluster | undefined;
}

/** Before all server tests: a cluster, unless the runner has brought one, and one migrated database to copy from. */
export default async function globalSetup(): Promise<void> {
  if (!process.env['TEST_POSTGRES_ADMIN_URL']) {
    globalThis.rimewardCluster = await startCluster();
    process.env['TEST_POSTGRES_ADMIN_URL'] = globalThis.rimewardCluster.adminUrl;
  }
  process.env['TEST_TEMPLATE_DATABASE'] = `template_${randomBytes(6).toString('hex')}`;
  await makeTemplate();
}
