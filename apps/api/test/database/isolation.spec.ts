import { randomUUID } from 'node:crypto';
import { CompanyContext } from '../../src/database/company-context';
import { User } from '../../src/users/entities/user.entity';
import { Visit } from '../../src/visits/entities/visit.entity';
import { rowsOf, withClient } from '../support/admin';
import { addCompany, addVisit, type TestCompany, type TestVisit } from '../support/company';
import { TestBrowser } from '../support/browser';
import { createTestApp, type TestApp } from '../support/test-app';

/** Calls of the long race; the attack list asks for 100,000, which `RACE_CALLS` runs. */
const raceCalls = Number(process.env.RACE_CALLS ?? 2_000);

describe('companies in one database', () => {
  let test: TestApp;
  let context: CompanyContext;
  let a: TestCompany;
  let b: TestCompany;
  let visitOfB: TestVisit;

  beforeAll(async () => {
    test = await createTestApp({ DATABASE_POOL: '2', REQUEST_LIMIT: '100000' });
    context = test.app.get(CompanyContext);
    a = await addCompany(test.database, 'Aspen');
    b = await addCompany(test.database, 'Birch');
    await addVisit(test.database, a, { assigned: [a.people.technician] });
    visitOfB = await addVisit(test.database, b, { assigned: [b.people.technician] });
  });

  afterAll(() => test.close());

  const asApp = <T>(sql: string, parameters: unknown[] = []): Promise<T[]> =>
    rowsOf<T>(test.database.appUrl, sql, parameters);

  it('show the application’s role nothing on any table while no company is named', async () => {
    const tables = await rowsOf<{ name: string }>(
      test.database.adminUrl,
      `select c.relname as name from pg_class c join pg_namespace n on n.oid = c.relnamespace
       where n.nspname = 'public' and c.relkind = 'r' and (c.relname = 'companies' or exists (
         select from pg_attribute where attrelid = c.oid and attname = 'company_id'))`,
    );
    expect(tables.length).toBeGreaterThan(20);
    for (const { name } of tables) {
      expect([name, await asApp(`select 1 from ${name}`)]).toEqual([name, []]);
    }
    expect(await rowsOf(test.database.adminUrl, 'select 1 from users')).toHaveLength(10);
  });

  it('are not seen after a transaction that named one has ended', async () => {
    await withClient(test.database.appUrl, async (client) => {
      await client.query('begin');
      await client.query("select set_config('app.company', $1, true)", [a.id]);
      expect((await client.query('select 1 from users')).rowCount).toBe(5);
      expect((await client.query('select 1 from users where company_id = $1', [b.id])).rowCount).toBe(0);
      await client.query('commit');
      expect((await client.query('select 1 from users')).rowCount).toBe(0);
    });
  });

  it('cannot be written into, changed or emptied from each other', async () => {
    await withClient(test.database.appUrl, async (client) => {
      const inA = async (sql: string, parameters: unknown[]): Promise<number | string | null> => {
        await client.query('begin');
        await client.query("select set_config('app.company', $1, true)", [a.id]);
        try {
          return (await client.query(sql, parameters)).rowCount;
        } catch (error) {
          return (error as { code: string }).code;
        } finally {
          await client.query('rollback');
        }
      };
      const violatesPolicy = '42501';
      const violatesForeignKey = '23503';
      const crew = [b.id, randomUUID(), 'Intruders'];
      expect(await inA('insert into crews (company_id, id, name) values ($1, $2, $3)', crew)).toBe(
        violatesPolicy,
      );
      expect(await inA('update crews set company_id = $1', [b.id])).toBe(violatesPolicy);
      expect(await inA(`update users set role = 'owner' where id = $1`, [b.people.technician.id])).toBe(0);
      expect(await inA('delete from visits where id = $1', [visitOfB.id])).toBe(0);
      expect(
        await inA('insert into visit_assignments (company_id, visit_id, user_id) values ($1, $2, $3)', [
          a.id,
          visitOfB.id,
          a.people.technician.id,
        ]),
      ).toBe(violatesForeignKey);
    });
  });

  it('let a look-up find one row by a value that its holder names, and change nothing', async () => {
    const { email } = a.people.owner;
    const found = await context.lookUp({ by: 'sign_in_email', value: email }, (manager) =>
      manager.find(User),
    );
    expect(found.map((user) => user.email)).toEqual([email]);
    const changed = await context.lookUp({ by: 'sign_in_email', value: email }, (manager) =>
      manager.update(User, { email }, { role: 'technician' }),
    );
    expect(changed.affected).toBe(0);
    const visits = await context.lookUp({ by: 'sign_in_email', value: email }, (manager) =>
      manager.find(Visit),
    );
    expect(visits).toEqual([]);
    expect(() => context.lookUp({ by: 'session', value: '' }, () => Promise.resolve())).toThrow(
      'needs a value',
    );
  });

  it('need to be named before any work, and stay the same inside it', async () => {
    expect(() => context.run('', () => Promise.resolve())).toThrow('needs a company');
    expect(() => context.run(undefined as never, () => Promise.resolve())).toThrow('needs a company');
    const nested = context.run(a.id, () => context.run(b.id, (manager) => manager.find(User)));
    await expect(nested).rejects.toThrow('One transaction belongs to one company');
    const joined = await context.run(a.id, (outer) =>
      context.run(a.id, (inner) => Promise.resolve(outer === inner)),
    );
    expect(joined).toBe(true);
    await expect(context.run('not-a-uuid', (manager) => manager.find(User))).rejects.toThrow();
  });

  it('never mix on a pool of two connections, with errors and slow work in between', async () => {
    let foreign = 0;
    let faults = 0;
    const call = async (n: number): Promise<void> => {
      const [own, other] = n % 2 === 0 ? [a, b] : [b, a];
      try {
        await context.run(own.id, async (manager) => {
          const users = await manager.find(User);
          const visits = await manager.find(Visit);
          foreign += [...users, ...visits].filter(({ companyId }) => companyId !== own.id).length;
          foreign += (await manager.findBy(User, { companyId: other.id })).length;
          if (users.length !== 5) foreign += 1;
          if (n % 7 === 0) await manager.query('select 1 / 0');
          if (n % 11 === 0) throw new Error('given up');
          if (n % 13 === 0) await manager.query('select pg_sleep(0.001)');
        });
      } catch {
        faults += 1;
      }
    };
    for (let begun = 0; begun < raceCalls; begun += 200) {
      await Promise.all(Array.from({ length: 200 }, (_, index) => call(begun + index)));
    }
    expect(foreign).toBe(0);
    const expected = Array.from({ length: raceCalls }, (_, n) => n % 7 === 0 || n % 11 === 0).filter(
      Boolean,
    ).length;
    expect(faults).toBe(expected);
  }, 600_000);

  it('never mix over HTTP either, while many requests are given up half-way', async () => {
    const sides = [
      { own: 'Aspen', other: 'Birch', browser: await TestBrowser.of(test, a.people.owner) },
      { own: 'Birch', other: 'Aspen', browser: await TestBrowser.of(test, b.people.owner) },
    ];
    const paths = [
      '/api/visits?from=2026-01-01&to=2026-12-31',
      '/api/company',
      '/api/sites',
      '/api/sync/pull',
    ];
    let answered = 0;
    const ask = async (n: number): Promise<void> => {
      const side = sides[n % 2] ?? sides[0];
      const path = paths[n % paths.length] ?? '/api/company';
      if (!side) return;
      const cookie = [...side.browser.cookies].map(([name, value]) => `${name}=${value}`).join('; ');
      const givesUp = n % 5 === 0 ? { signal: AbortSignal.timeout(5 + (n % 40)) } : {};
      const answer = await fetch(`${test.url}${path}`, { headers: { cookie }, ...givesUp }).catch(() => null);
      const text = await answer?.text().catch(() => null);
      if (!text) return;
      answered += 1;
      expect([path, answer?.status, text.includes(side.own), text.includes(side.other)]).toEqual([
        path,
        200,
        true,
        false,
      ]);
    };
    for (let begun = 0; begun < 600; begun += 200) {
      await Promise.all(Array.from({ length: 200 }, (_, index) => ask(begun + index)));
    }
    expect(answered).toBeGreaterThan(400);
  }, 120_000);
});
