import { roles, type Role } from '@rimeward/contracts';
import { randomUUID } from 'node:crypto';
import { addCompany, type TestCompany } from '../support/company';
import { TestBrowser } from '../support/browser';
import { createTestApp, type TestApp } from '../support/test-app';
import { routesOf } from './routes';

const everybody = [...roles];
const desk: Role[] = ['supervisor', 'office', 'owner'];
const deciders: Role[] = ['supervisor', 'owner'];

/** Who may call what. A route that is not here fails, and so does a line whose route is gone. */
const expected: Record<string, 'public' | 'device' | Role[]> = {
  'GET /api/health': 'public',
  'POST /api/auth/sign-in': 'public',
  'POST /api/auth/renew': 'public',
  'POST /api/auth/sign-out': 'public',
  'GET /api/auth/session': everybody,
  'GET /api/company': everybody,
  'PUT /api/company/settings': ['owner'],
  'PATCH /api/users/me': everybody,
  'POST /api/devices': everybody,
  'POST /api/devices/:id/lease': everybody,
  'POST /api/devices/:id/revoke': deciders,
  'GET /api/sites': everybody,
  'GET /api/sites/:id': everybody,
  'GET /api/visits': everybody,
  'GET /api/visits/:id': everybody,
  'POST /api/sync/push': 'device',
  'GET /api/sync/pull': everybody,
  'POST /api/photos/announce': 'device',
  'POST /api/photos/:sha256/parts/:n': 'device',
  'POST /api/photos/:sha256/preview': 'device',
  'POST /api/photos/:sha256/complete': 'device',
  'GET /api/photos/:sha256/original': everybody,
  'GET /api/photos/:sha256/preview': everybody,
  'GET /api/review/visits': desk,
  'GET /api/review/visits/:id': desk,
  'POST /api/review/visits/:id/decisions': deciders,
  'GET /api/review/devices': desk,
  'GET /api/review/held': desk,
  'POST /api/review/held/:id/settle': desk,
};

describe('access to the API', () => {
  let test: TestApp;
  let company: TestCompany;

  beforeAll(async () => {
    test = await createTestApp();
    company = await addCompany(test.database, 'Alder');
  });

  afterAll(() => test.close());

  const send = (browser: TestBrowser, route: string, headers: Record<string, string> = {}) => {
    const [method = '', path = ''] = route.split(' ');
    const filled = path.replace(':sha256', 'a'.repeat(64)).replace(':id', randomUUID()).replace(':n', '0');
    return method === 'GET'
      ? browser.get(filled, headers)
      : browser.send(method, filled, { 'Content-Type': 'application/json', ...headers }, '{}');
  };

  it('is declared for every route, and for no other', () => {
    const declared = routesOf(test.app).map(({ method, path, access }) => [
      `${method} ${path}`,
      access?.kind === 'roles' ? [...access.roles].sort() : access?.kind,
    ]);
    const sorted = Object.entries(expected).map(([route, who]) => [
      route,
      Array.isArray(who) ? [...who].sort() : who,
    ]);
    expect(Object.fromEntries(declared)).toEqual(Object.fromEntries(sorted));
  });

  it('puts the device guard before each route for devices, and before no other', () => {
    const guarded = routesOf(test.app).filter(({ guards }) => guards.includes('DeviceGuard'));
    expect(guarded.map(({ access }) => access?.kind)).toEqual(guarded.map(() => 'device'));
    expect(guarded).toHaveLength(Object.values(expected).filter((who) => who === 'device').length);
  });

  it.each(Object.entries(expected).filter(([, who]) => who !== 'public'))(
    'refuses a stranger: %s',
    async (route) => {
      const answer = await send(new TestBrowser(test), route);
      expect(answer.status).toBe(401);
      const invented = await send(new TestBrowser(test), route, {
        Authorization: `Device ${randomUUID()}.${'s'.repeat(43)}`,
        Cookie: '__Host-rw_access=x.y.z',
      });
      expect(invented.status).toBe(401);
    },
  );

  it.each(everybody)('lets a %s in where the table says so, and nowhere else', async (role) => {
    const browser = await TestBrowser.of(test, company.people[role]);
    for (const [route, who] of Object.entries(expected)) {
      if (who === 'public') continue;
      const { status } = await send(browser, route);
      const allowed = Array.isArray(who) && who.includes(role);
      const refused = who === 'device' ? 401 : 403;
      expect([
        route,
        allowed ? status !== 401 && status !== 403 && status < 500 : status === refused,
      ]).toEqual([route, true]);
    }
  });

  it('lets a device bring and never read', async () => {
    const browser = await TestBrowser.of(test, company.people.technician);
    const enrolled = await browser.post('/api/devices', { name: 'Phone', platform: 'test' });
    expect(enrolled.status).toBe(201);
    const { deviceId, ingestSecret } = enrolled.body as Record<string, unknown>;
    const credential = { Authorization: `Device ${String(deviceId)}.${String(ingestSecret)}` };
    for (const [route, who] of Object.entries(expected)) {
      if (who === 'public') continue;
      const { status } = await send(new TestBrowser(test), route, credential);
      expect([route, who === 'device' ? status !== 401 && status !== 403 : status === 401]).toEqual([
        route,
        true,
      ]);
    }
  });

  it('does not know what is not there', async () => {
    const browser = await TestBrowser.of(test, company.people.owner);
    for (const path of [
      '/api/nothing',
      '/api/docs',
      '/api/metrics',
      '/api/health/detail',
      '/api',
      '/.env',
      '/.git/config',
    ]) {
      const answer = await browser.get(path);
      expect([path, answer.status, answer.body.code]).toEqual([path, 404, 'not-found']);
    }
    expect(
      (await browser.send('TRACE', '/api/health').catch(() => ({ status: 405 }))).status,
    ).toBeGreaterThan(403);
  });
});
