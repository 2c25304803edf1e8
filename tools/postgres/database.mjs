import { createRequire } from 'node:module';
import { join } from 'node:path';
import { root } from '../lib/paths.mjs';

/**
 * Makes the two roles and the database where they are missing. The migrator owns the schema; the application's role owns nothing
 * and cannot pass row level security.
 */
export async function prepareDatabase({ adminUrl, name, passwords }) {
  await asAdmin(adminUrl, async (client) => {
    for (const role of ['migrator', 'app']) {
      const found = await client.query('select from pg_roles where rolname = $1', [`rimeward_${role}`]);
      if (found.rowCount === 0)
        await client.query(
          `create role rimeward_${role} login nosuperuser nobypassrls nocreatedb nocreaterole`,
        );
      await client.query(`alter role rimeward_${role} password ${client.escapeLiteral(passwords[role])}`);
    }
    const found = await client.query('select from pg_database where datname = $1', [name]);
    if (found.rowCount === 0)
      await client.query(`create database ${client.escapeIdentifier(name)} owner rimeward_migrator`);
    await client.query(`revoke all on database ${client.escapeIdentifier(name)} from public`);
    await client.query(`grant connect on database ${client.escapeIdentifier(name)} to rimeward_app`);
  });
  const url = (user, password) => {
    const address = new URL(adminUrl);
    address.username = user;
    address.password = encodeURIComponent(password);
    address.pathname = `/${name}`;
    return address.href;
  };
  const admin = new URL(adminUrl);
  admin.pathname = `/${name}`;
  return {
    adminUrl: admin.href,
    migratorUrl: url('rimeward_migrator', passwords.migrator),
    appUrl: url('rimeward_app', passwords.app),
  };
}

export async function dropDatabase(adminUrl, name) {
  await asAdmin(adminUrl, (client) =>
    client.query(`drop database if exists ${client.escapeIdentifier(name)} with (force)`),
  );
}

async function asAdmin(adminUrl, work) {
  // The client comes with the packages, which are there by the time a database is made.
  const { Client } = createRequire(join(root, 'apps/api/package.json'))('pg');
  const client = new Client({ connectionString: adminUrl });
  await client.connect();
  try {
    await work(client);
  } finally {
    await client.end();
  }
}
