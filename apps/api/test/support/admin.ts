import { Client } from 'pg';

/** One connection for one piece of work, closed whatever happens. */
export async function withClient<T>(url: string, work: (client: Client) => Promise<T>): Promise<T> {
  const client = new Client({ connectionString: url });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

/** Rows of one query. With a superuser's address it looks past row level security. */
export async function rowsOf<T>(url: string, sql: string, parameters: unknown[] = []): Promise<T[]> {
  return withClient(url, async (client) => (await client.query(sql, parameters)).rows as T[]);
}
