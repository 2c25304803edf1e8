import type { Role, VisitDocument } from '@rimeward/contracts';
import { systemSchema } from '@rimeward/field-log';
import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { seedDemo } from '../../src/demo/seed-demo';
import { demoSites } from '../../src/demo/world/sites';
import { rowsOf } from '../support/admin';
import { TestBrowser } from '../support/browser';
import { createTestApp, type TestApp } from '../support/test-app';

interface Account {
  role: Role;
  name: string;
  email: string;
  password: string;
}

/** A Thursday, before dawn in the company's town. */
const now = new Date('2026-10-15T12:00:00Z');
const today = '2026-10-15';

describe('the demo company', () => {
  let test: TestApp;
  let dataDir: string;
  let accounts: Account[];

  beforeAll(async () => {
    test = await createTestApp();
    dataDir = mkdtempSync(join(tmpdir(), 'rimeward-demo-'));
    await seedDemo(test.app, { now, dataDir });
    accounts = JSON.parse(readFileSync(join(dataDir, 'demo-accounts.json'), 'utf8')) as Account[];
  }, 120_000);

  afterAll(async () => {
    await test.close();
    rmSync(dataDir, { recursive: true });
  });

  const count = async (table: string): Promise<number> => {
    const [row] = await rowsOf<{ n: string }>(test.database.adminUrl, `select count(*) as n from ${table}`);
    return Number(row?.n);
  };
  const browserOf = (role: Role): Promise<TestBrowser> => {
    const account = accounts.find((one) => one.role === role);
    if (!account) throw new Error(`no ${role} in the accounts`);
    return TestBrowser.of(test, account);
  };

  it('lets one owner, one office, two supervisors and six technicians sign in', async () => {
    expect(accounts.map(({ role }) => role).sort()).toEqual(
      ['office', 'owner', 'supervisor', 'supervisor', ...Array<Role>(6).fill('technician')].sort(),
    );
    for (const { email, password } of accounts) {
      expect(password.length).toBeGreaterThanOrEqual(15);
      const answer = await new TestBrowser(test).signIn({ email, password });
      expect([email, answer.status]).toEqual([email, 200]);
    }
    const spanish = accounts.find(({ name }) => name.startsWith('Ximena'));
    const session = await (await TestBrowser.of(test, spanish ?? accounts[0]!)).get('/api/auth/session');
    expect(session.body.user).toMatchObject({ language: 'es' });
  });

  it('has 60 sites of 3 to 14 zones whose systems the log library accepts', async () => {
    const rows = await rowsOf<{ description: unknown }>(
      test.database.adminUrl,
      'select description from systems',
    );
    expect(rows).toHaveLength(60);
    const systems = rows.map(({ description }) => systemSchema.parse(description));
    expect(Math.min(...systems.map(({ zones }) => zones.length))).toBe(3);
    expect(Math.max(...systems.map(({ zones }) => zones.length))).toBe(14);
    const kinds = new Set(systems.map(({ backflow }) => backflow.kind));
    expect([...kinds].sort()).toEqual(['AVB', 'DCVA', 'PVB', 'RPA', 'SVB', 'none', 'unknown']);
    expect(new Set(systems.map((one) => one.removalMethod)).size).toBe(4);
    expect(systems.filter(({ pump }) => pump !== null)).toHaveLength(1);
  });

  it('begins the first technician’s day at the eight-zone site, with last year beside it', async () => {
    const technician = await browserOf('technician');
    const answer = await technician.get(`/api/visits?from=${today}&to=${today}`);
    const visits = answer.body as unknown as VisitDocument[];
    expect(visits.map(({ sequence }) => sequence)).toEqual([1, 2, 3, 4, 5]);
    expect(visits[0]?.system.zones).toHaveLength(8);
    expect(visits[0]?.system.sensitiveParts.map(({ kind }) => kind)).toEqual(['flow-sensor']);
    expect(visits.filter(({ lastYear }) => lastYear !== null).length).toBeGreaterThan(2);
  });

  it('has about five stops a day for each crew this week', async () => {
    const rows = await rowsOf<{ date: string; n: number }>(
      test.database.adminUrl,
      'select date::text, count(*)::int as n from visits group by date order by date',
    );
    expect(rows).toEqual([
      { date: '2026-10-14', n: 6 },
      { date: '2026-10-15', n: 15 },
      { date: '2026-10-16', n: 15 },
      { date: '2026-10-17', n: 12 },
      { date: '2026-10-18', n: 12 },
    ]);
  });

  it('shows last night’s work to the supervisor: left visits, one still on a phone, one held entry', async () => {
    const supervisor = await browserOf('supervisor');
    const queue = await supervisor.get('/api/review/visits');
    const items = queue.body.items as { standing: string; photos: number; cycles: number }[];
    expect(items.filter(({ standing }) => standing === 'to-review')).toHaveLength(5);
    expect(items.filter(({ standing }) => standing === 'under-way')).toHaveLength(1);
    const devices = (await supervisor.get('/api/review/devices')).body.devices as {
      manifest: { pendingEntries: number } | null;
    }[];
    expect(devices.map(({ manifest }) => manifest?.pendingEntries).sort()).toEqual([0, 0, 14]);
    const held = (await supervisor.get('/api/review/held')).body.entries as { heldReason: string }[];
    expect(held.map(({ heldReason }) => heldReason)).toEqual(['unknown-type']);
    const photos = await rowsOf<{ state: string }>(
      test.database.adminUrl,
      'select distinct state from photos',
    );
    expect(photos).toEqual([{ state: 'complete' }]);
  });

  it('changes nothing when it is seeded again, and plans the days that have come since', async () => {
    const before = [
      await count('visits'),
      await count('log_entries'),
      await count('feed'),
      await count('users'),
    ];
    await seedDemo(test.app, { now, dataDir });
    expect([
      await count('visits'),
      await count('log_entries'),
      await count('feed'),
      await count('users'),
    ]).toEqual(before);
    await seedDemo(test.app, { now: new Date('2026-10-20T12:00:00Z'), dataDir });
    const later = await rowsOf<{ n: number }>(
      test.database.adminUrl,
      `select count(*)::int as n from visits where date = '2026-10-20'`,
    );
    expect(later).toEqual([{ n: 15 }]);
    expect(await count('log_entries')).toBe(before[1]);
  });

  it('is the same whenever it is made', () => {
    expect(JSON.stringify(demoSites())).toBe(JSON.stringify(demoSites()));
  });
});
