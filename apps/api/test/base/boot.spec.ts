import { withClient } from '../support/admin';
import { addCompany } from '../support/company';
import { TestBrowser } from '../support/browser';
import { createTestDatabase, type TestDatabase } from '../support/database';
import { createTestApp, type TestApp } from '../support/test-app';

describe('a running server', () => {
  let test: TestApp;

  beforeAll(async () => {
    test = await createTestApp();
  });

  afterAll(() => test.close());

  it('answers health once the database answers', async () => {
    const response = await fetch(`${test.url}/api/health`);
    expect(response.status).toBe(200);
    expect(await response.json()).toEqual({ status: 'ok' });
  });

  it('answers problem details for an address that does not exist', async () => {
    const response = await fetch(`${test.url}/api/nothing-here`);
    expect(response.status).toBe(404);
    expect(response.headers.get('content-type')).toContain('application/problem+json');
    expect(await response.json()).toMatchObject({ code: 'not-found', status: 404 });
  });

  it('is not ready while the database lacks a migration', async () => {
    const sql = (text: string): Promise<unknown> =>
      withClient(test.database.adminUrl, (client) => client.query(text));
    await sql('create table kept as select * from migrations order by id desc limit 1');
    await sql('delete from migrations where id in (select id from kept)');
    expect((await fetch(`${test.url}/api/health`)).status).toBe(503);
    await sql('insert into migrations select * from kept');
    expect((await fetch(`${test.url}/api/health`)).status).toBe(200);
  });
});

describe('a server that loses its database', () => {
  let database: TestDatabase;
  let test: TestApp;

  beforeAll(async () => {
    database = await createTestDatabase();
    test = await createTestApp({}, database);
  });

  afterAll(async () => {
    await test.close();
    await database.drop();
  });

  it('stays up, says so plainly, and goes on when it is back', async () => {
    const { people } = await addCompany(database, 'Bracken');
    const browser = await TestBrowser.of(test, people.owner);
    const name = new URL(database.adminUrl).pathname.slice(1);

    await renamed(database, name, `${name}_away`);
    expect((await browser.get('/api/health')).body).toEqual({
      type: 'urn:rimeward:problem:unavailable',
      title: 'unavailable',
      status: 503,
      code: 'unavailable',
    });
    for (const path of ['/api/auth/session', '/api/visits?from=2026-01-01&to=2026-01-02']) {
      const answer = await browser.get(path);
      expect([path, answer.status, answer.body.code]).toEqual([path, 503, 'unavailable']);
      expect(answer.text).not.toContain(name);
    }
    expect((await browser.signIn(people.owner)).body.code).toBe('unavailable');

    await renamed(database, `${name}_away`, name);
    expect((await browser.get('/api/health')).status).toBe(200);
    expect((await browser.get('/api/auth/session')).status).toBe(200);
  });
});

/** Takes a database away by another name, throwing everybody out of it first. */
async function renamed({ adminUrl }: TestDatabase, from: string, to: string): Promise<void> {
  const onServer = new URL(adminUrl);
  onServer.pathname = '/postgres';
  await withClient(onServer.href, async (client) => {
    await client.query('select pg_terminate_backend(pid) from pg_stat_activity where datname = $1', [from]);
    await client.query(`alter database ${from} rename to ${to}`);
  });
}
