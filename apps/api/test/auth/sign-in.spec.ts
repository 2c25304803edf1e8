import { PasswordService } from '../../src/auth/password.service';
import { withClient } from '../support/admin';
import { addCompany, testPassword, type TestCompany } from '../support/company';
import { TestBrowser } from '../support/browser';
import { createTestApp, type TestApp } from '../support/test-app';

const from = (address: string): Record<string, string> => ({ 'X-Forwarded-For': address });
const wrong = 'not the password at all';

describe('signing in', () => {
  let test: TestApp;
  let company: TestCompany;

  beforeAll(async () => {
    test = await createTestApp();
    company = await addCompany(test.database, 'Sedge');
  });

  afterAll(() => test.close());

  it('answers who it is, for whom, and until when', async () => {
    const { technician } = company.people;
    const browser = new TestBrowser(test);
    const answer = await browser.signIn(technician);
    expect(answer.status).toBe(200);
    expect(answer.body).toMatchObject({
      user: { id: technician.id, email: technician.email, role: 'technician', language: 'en' },
      company: { id: company.id, name: 'Sedge' },
    });
    const session = await browser.get('/api/auth/session');
    expect(session.body.user).toEqual(answer.body.user);
    const left = Date.parse(String(session.body.accessExpiresAt)) - Date.now();
    expect(left).toBeGreaterThan(9 * 60_000);
    expect(left).toBeLessThanOrEqual(10 * 60_000);
  });

  it('takes the e-mail in any case and with blanks around it', async () => {
    const { email } = company.people.office;
    const answer = await new TestBrowser(test).signIn({ email: email.toUpperCase(), password: testPassword });
    expect(answer.status).toBe(200);
  });

  it('puts both tokens into cookies that no script, no other host and no plain connection gets', async () => {
    const answer = await new TestBrowser(test).signIn(company.people.owner);
    const cookies = answer.headers.getSetCookie();
    expect(cookies.map((one) => one.split('=')[0]).sort()).toEqual([
      '__Host-rw_access',
      '__Host-rw_known',
      '__Host-rw_session',
    ]);
    for (const cookie of cookies) {
      expect(cookie).toMatch(/; Path=\/(;|$)/);
      expect(cookie).toContain('; HttpOnly');
      expect(cookie).toContain('; Secure');
      expect(cookie).toContain('; SameSite=Strict');
      expect(cookie).not.toContain('Domain');
    }
    expect(answer.text).not.toContain(cookies[0]?.split('=')[1]?.split(';')[0]);
    expect(answer.headers.get('cache-control')).toBe('no-store');
  });

  it('answers an unknown e-mail and a wrong password alike, in text and in time', async () => {
    // Hashed as the application hashes: the test companies' own hashes are cheap on purpose.
    const stored = await test.app.get(PasswordService).hash(testPassword);
    await withClient(test.database.adminUrl, (client) =>
      client.query('update users set password_hash = $2 where id = $1', [
        company.people.technician.id,
        stored,
      ]),
    );
    const times = { known: [] as number[], unknown: [] as number[] };
    const texts = new Set<string>();
    for (let round = 0; round < 40; round += 1) {
      for (const kind of ['known', 'unknown'] as const) {
        // A new account and address each time, so that nothing is blocked.
        const email = kind === 'known' ? company.people.technician.email : `nobody${round}@sedge.example`;
        const begun = performance.now();
        const answer = await new TestBrowser(test).signIn(
          { email, password: wrong },
          from(`10.1.${round}.${kind === 'known' ? 1 : 2}`),
        );
        times[kind].push(performance.now() - begun);
        texts.add(`${answer.status} ${answer.text}`);
        if (round % 9 === 8) await new TestBrowser(test).signIn(company.people.technician, from('10.2.0.1'));
      }
    }
    expect([...texts]).toEqual([
      '401 {"type":"urn:rimeward:problem:sign-in-failed","title":"sign in failed","status":401,"code":"sign-in-failed"}',
    ]);
    expect(Math.abs(median(times.known) - median(times.unknown))).toBeLessThan(20);
  }, 120_000);

  it('blocks an account after ten wrong passwords from changing addresses, but not its own browser', async () => {
    const person = company.people.supervisor;
    const own = await TestBrowser.of(test, person);
    const tries = await Promise.all(
      Array.from({ length: 14 }, (_, index) =>
        new TestBrowser(test).signIn({ email: person.email, password: wrong }, from(`10.3.0.${index}`)),
      ),
    );
    expect(tries.map(({ status }) => status).sort()).toEqual([
      ...Array<number>(10).fill(401),
      429,
      429,
      429,
      429,
    ]);
    const stranger = await new TestBrowser(test).signIn(person, from('10.3.1.1'));
    expect(stranger.body.code).toBe('too-many-attempts');
    expect(Number(stranger.headers.get('retry-after'))).toBeGreaterThan(500);
    expect((await own.signIn(person, from('10.3.1.2'))).status).toBe(200);
  });

  it('blocks an address that tries one password on many accounts', async () => {
    const statuses: number[] = [];
    for (let n = 0; n < 70; n += 1) {
      const email = `account${n}@sedge.example`;
      statuses.push(
        (await new TestBrowser(test).signIn({ email, password: wrong }, from('10.4.0.1'))).status,
      );
    }
    expect(statuses.indexOf(429)).toBe(60);
    expect(new Set(statuses.slice(60))).toEqual(new Set([429]));
  });

  it('does not let in a person who has been disabled', async () => {
    const other = await addCompany(test.database, 'Gone');
    await withClient(test.database.adminUrl, (client) =>
      client.query('update users set disabled_at = now() where id = $1', [other.people.office.id]),
    );
    expect((await new TestBrowser(test).signIn(other.people.office)).body.code).toBe('sign-in-failed');
  });

  it.each([
    ['no body', undefined],
    ['an empty e-mail', { email: '', password: 'x' }],
    ['a password of another type', { email: 'a@b.example', password: { $ne: '' } }],
    ['more than it asks for', { email: 'a@b.example', password: 'x', role: 'owner' }],
    ['a password of 10,000 letters', { email: 'a@b.example', password: 'x'.repeat(10_000) }],
  ])('refuses %s and says which field', async (_, body) => {
    const answer = await new TestBrowser(test).post('/api/auth/sign-in', body);
    expect([400, 422]).toContain(answer.status);
    expect(answer.headers.get('content-type')).toContain('application/problem+json');
    expect(answer.text).not.toMatch(/zod|stack|Error/i);
  });
});

function median(values: number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.floor(sorted.length / 2)] ?? NaN;
}
