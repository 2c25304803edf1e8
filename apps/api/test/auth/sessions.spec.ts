import { addCompany, type TestCompany, type TestPerson } from '../support/company';
import { rowsOf, withClient } from '../support/admin';
import { TestBrowser } from '../support/browser';
import { createTestApp, type TestApp } from '../support/test-app';

const session = '__Host-rw_session';
const access = '__Host-rw_access';

describe('a session', () => {
  let test: TestApp;
  let company: TestCompany;

  beforeAll(async () => {
    test = await createTestApp();
    company = await addCompany(test.database, 'Reed');
  });

  afterAll(() => test.close());

  const sql = (text: string, parameters: unknown[]): Promise<unknown> =>
    withClient(test.database.adminUrl, (client) => client.query(text, parameters));
  /** As if this much time had gone by since everything that the sessions of this person remember. */
  const letPass = (person: TestPerson, interval: string): Promise<unknown> =>
    sql(
      `update sessions set rotated_at = rotated_at - $2::interval, last_used_at = last_used_at - $2::interval,
         idle_until = idle_until - $2::interval, expires_at = expires_at - $2::interval where user_id = $1`,
      [person.id, interval],
    );
  const renew = (browser: TestBrowser): ReturnType<TestBrowser['post']> => browser.post('/api/auth/renew');
  const isIn = async (browser: TestBrowser): Promise<number> =>
    (await browser.get('/api/auth/session')).status;

  it('is stored without anything that opens it', async () => {
    const browser = await TestBrowser.of(test, company.people.office);
    const token = browser.cookies.get(session) ?? '';
    const [, , secret = ''] = token.split('.');
    expect(Buffer.from(secret, 'base64url')).toHaveLength(32);
    const rows = await rowsOf<object>(test.database.adminUrl, 'select * from sessions');
    expect(JSON.stringify(rows)).not.toContain(secret);
  });

  it('goes on after its answer was lost, with the same successor', async () => {
    const browser = await TestBrowser.of(test, company.people.technician);
    await letPass(company.people.technician, '5 minutes');
    const lost = browser.copy();
    expect((await renew(lost)).status).toBe(200);
    await letPass(company.people.technician, '3 days');
    expect((await renew(browser)).status).toBe(200);
    expect(browser.cookies.get(session)).toBe(lost.cookies.get(session));
    expect(await isIn(browser)).toBe(200);
  });

  it('ends for everybody when a token comes back after its successor was used', async () => {
    const browser = await TestBrowser.of(test, company.people.technician);
    const thief = browser.copy();
    await letPass(company.people.technician, '5 minutes');
    await renew(browser);
    expect(await isIn(browser)).toBe(200);
    await letPass(company.people.technician, '5 minutes');
    expect((await renew(thief)).body.code).toBe('session-ended');
    expect(await isIn(browser)).toBe(401);
    expect((await renew(browser)).body.code).toBe('session-ended');
    const [row] = await rowsOf<{ ended_because: string }>(
      test.database.adminUrl,
      'select ended_because from sessions where user_id = $1 and ended_at is not null',
      [company.people.technician.id],
    );
    expect(row?.ended_because).toBe('token used twice');
  });

  it('is never lost to two tabs that renew at once', async () => {
    const person = company.people.secondTechnician;
    const first = await TestBrowser.of(test, person);
    for (let round = 0; round < 60; round += 1) {
      await letPass(person, '2 minutes');
      const second = first.copy();
      const answers = await Promise.all([renew(first), renew(second), isIn(first)]);
      expect([answers[0].status, answers[1].status]).toEqual([200, 200]);
      expect(second.cookies.get(session)).toBe(first.cookies.get(session));
    }
    expect(await isIn(first)).toBe(200);
  });

  it('is renewed from the same old token by many at once, and stays one session', async () => {
    const person = company.people.supervisor;
    const browser = await TestBrowser.of(test, person);
    await letPass(person, '2 minutes');
    const tabs = Array.from({ length: 12 }, () => browser.copy());
    const answers = await Promise.all(tabs.map(renew));
    expect(answers.map(({ status }) => status)).toEqual(tabs.map(() => 200));
    expect(new Set(tabs.map(({ cookies }) => cookies.get(session))).size).toBe(1);
  });

  it.each([
    ['office', '61 minutes', '12 hours 1 minute', '50 minutes'],
    ['technician', '14 days 1 minute', '30 days 1 minute', '13 days'],
  ] as const)(
    'of a %s ends after its time without use, and after its whole time with it',
    async (role, idle, absolute, used) => {
      const own = await addCompany(test.database, `Limits ${role}`);
      const person = own.people[role];
      const left = await TestBrowser.of(test, person);
      await letPass(person, idle);
      expect(await isIn(left)).toBe(401);
      expect((await renew(left)).body.code).toBe('session-ended');
      const busy = await TestBrowser.of(test, person);
      await letPass(person, used);
      expect((await renew(busy)).status).toBe(200);
      expect(await isIn(busy)).toBe(200);
      await sql(`update sessions set expires_at = expires_at - $2::interval where user_id = $1`, [
        person.id,
        absolute,
      ]);
      expect(await isIn(busy)).toBe(401);
      expect((await renew(busy)).body.code).toBe('session-ended');
    },
  );

  it('ends at once when the person signs out, even if only the renewal cookie is left', async () => {
    const browser = await TestBrowser.of(test, company.people.owner);
    const copied = browser.copy();
    browser.cookies.delete(access);
    expect((await browser.post('/api/auth/sign-out')).status).toBe(204);
    expect(browser.cookies.has(session)).toBe(false);
    expect(await isIn(copied)).toBe(401);
    expect((await renew(copied)).body.code).toBe('session-ended');
    expect((await new TestBrowser(test).post('/api/auth/sign-out')).status).toBe(204);
  });

  it('ends at once when the person is disabled, and follows his role at once', async () => {
    const own = await addCompany(test.database, 'Changes');
    const demoted = await TestBrowser.of(test, own.people.supervisor);
    expect((await demoted.get('/api/review/devices')).status).toBe(200);
    await sql(`update users set role = 'technician' where id = $1`, [own.people.supervisor.id]);
    expect((await demoted.get('/api/review/devices')).body.code).toBe('not-allowed');
    await sql('update users set disabled_at = now() where id = $1', [own.people.supervisor.id]);
    expect(await isIn(demoted)).toBe(401);
    expect((await renew(demoted)).body.code).toBe('session-ended');
  });

  it('is not opened by an altered or an invented token', async () => {
    const browser = await TestBrowser.of(test, company.people.office);
    const [id, generation, secret = ''] = (browser.cookies.get(session) ?? '').split('.');
    const { people } = company;
    for (const token of [
      `${id}.${Number(generation) + 1}.${secret}`,
      `${people.owner.id}.${generation}.${secret}`,
      `${id}.${generation}.${'A'.repeat(43)}`,
      'x',
      '',
    ]) {
      const forged = new TestBrowser(test);
      forged.cookies.set(session, token);
      expect((await renew(forged)).body.code).toBe('not-signed-in');
    }
    expect(await isIn(browser)).toBe(200);
    const [head, payload = '', signature] = (browser.cookies.get(access) ?? '').split('.');
    const claims = JSON.parse(Buffer.from(payload, 'base64url').toString()) as object;
    const asOwner = Buffer.from(JSON.stringify({ ...claims, sub: people.owner.id })).toString('base64url');
    const unsigned = Buffer.from('{"alg":"none","typ":"JWT"}').toString('base64url');
    for (const token of [`${head}.${asOwner}.${signature}`, `${unsigned}.${asOwner}.`]) {
      const forged = new TestBrowser(test);
      forged.cookies.set(access, token);
      expect(await isIn(forged)).toBe(401);
    }
  });
});
