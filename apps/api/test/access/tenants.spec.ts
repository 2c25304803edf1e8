import { randomUUID } from 'node:crypto';
import { rowsOf } from '../support/admin';
import { addCompany, addVisit, type TestCompany, type TestVisit } from '../support/company';
import { TestBrowser } from '../support/browser';
import { createTestApp, type TestApp } from '../support/test-app';

interface Side {
  company: TestCompany;
  visit: TestVisit;
  /** Assigned to the second technician only. */
  others: TestVisit;
  owner: TestBrowser;
  technician: TestBrowser;
  deviceId: string;
}

describe('two companies on one server', () => {
  let test: TestApp;
  let ours: Side;
  let theirs: Side;

  beforeAll(async () => {
    test = await createTestApp();
    ours = await side('Ours');
    theirs = await side('Theirs');
  });

  afterAll(() => test.close());

  async function side(name: string): Promise<Side> {
    const company = await addCompany(test.database, name);
    const { technician, secondTechnician, owner } = company.people;
    const browser = await TestBrowser.of(test, technician);
    const enrolled = await browser.post('/api/devices', { name: 'Phone', platform: 'test' });
    return {
      company,
      visit: await addVisit(test.database, company, { assigned: [technician] }),
      others: await addVisit(test.database, company, { assigned: [secondTechnician], sequence: 2 }),
      owner: await TestBrowser.of(test, owner),
      technician: browser,
      deviceId: String(enrolled.body.deviceId),
    };
  }

  it('answer 404 to each other’s ids, as to ids of nothing', async () => {
    const routes = (of: Side): [string, string, unknown?][] => [
      ['GET', `/api/visits/${of.visit.id}`],
      ['GET', `/api/sites/${of.visit.siteId}`],
      ['GET', `/api/review/visits/${of.visit.id}`],
      ['POST', `/api/devices/${of.deviceId}/revoke`, {}],
      ['POST', `/api/devices/${of.deviceId}/lease`, {}],
      [
        'POST',
        `/api/review/visits/${of.visit.id}/decisions`,
        { decision: 'return-visit', remark: null, questions: [], expectedNumber: 0, seenPosition: 0 },
      ],
    ];
    const nothing = { visit: { id: randomUUID(), siteId: randomUUID() }, deviceId: randomUUID() } as Side;
    const texts = new Set<string>();
    for (const [method, path, body] of [...routes(theirs), ...routes(nothing)]) {
      const answer = method === 'GET' ? await ours.owner.get(path) : await ours.owner.post(path, body);
      expect([path, answer.status]).toEqual([path, 404]);
      texts.add(answer.text);
    }
    expect(texts.size).toBe(1);
    const devices = await rowsOf(test.database.adminUrl, 'select from devices where revoked_at is not null');
    expect(devices).toHaveLength(0);
  });

  it('list nothing of each other', async () => {
    for (const path of [
      '/api/visits?from=2026-01-01&to=2026-12-31',
      '/api/sites',
      '/api/company',
      '/api/review/visits',
      '/api/review/devices',
      '/api/sync/pull',
    ]) {
      const answer = await ours.owner.get(path);
      expect([path, answer.status]).toEqual([path, 200]);
      expect(answer.text).not.toContain('Theirs');
      expect(answer.text).not.toContain(theirs.company.id);
    }
    expect((await ours.owner.get('/api/sites?q=Theirs')).body.sites).toEqual([]);
    expect((await ours.owner.get('/api/sites')).text).toContain('Ours');
  });

  it('show a technician his own visits and their sites, and nothing of his colleague’s', async () => {
    const mine = await ours.technician.get('/api/visits?from=2026-01-01&to=2026-12-31');
    expect((mine.body as unknown as { id: string }[]).map(({ id }) => id)).toEqual([ours.visit.id]);
    expect((await ours.technician.get(`/api/visits/${ours.others.id}`)).status).toBe(404);
    expect((await ours.technician.get(`/api/sites/${ours.others.siteId}`)).status).toBe(404);
    expect((await ours.technician.get(`/api/sites/${ours.visit.siteId}`)).body).toMatchObject({
      site: { id: ours.visit.siteId, gateCode: 'gate of Ours' },
      systems: [{ id: ours.visit.systemId }],
    });
    const sites = (await ours.technician.get('/api/sites')).body.sites as { id: string }[];
    expect(sites.map(({ id }) => id)).toEqual([ours.visit.siteId]);
    expect((await ours.owner.get('/api/sites')).body.sites).toHaveLength(2);
  });

  it('page through sites by name without losing or repeating any', async () => {
    const company = await addCompany(test.database, 'Many');
    for (let n = 0; n < 5; n += 1) await addVisit(test.database, company, { assigned: [], sequence: n + 1 });
    const owner = await TestBrowser.of(test, company.people.owner);
    const seen: string[] = [];
    let after: string | null = '';
    while (after !== null) {
      const page = await owner.get(`/api/sites?limit=2&after=${after}`);
      seen.push(...(page.body.sites as { id: string }[]).map(({ id }) => id));
      after = page.body.next as string | null;
    }
    expect(seen).toHaveLength(5);
    expect(new Set(seen).size).toBe(5);
  });

  it.each(['from=yesterday&to=2026-12-31', 'from=2026-12-31', 'from=2026-13-01&to=2026-12-31'])(
    'name the field at fault for %s',
    async (query) => {
      const answer = await ours.owner.get(`/api/visits?${query}`);
      expect(answer.status).toBe(422);
      expect(answer.body.code).toBe('validation-failed');
      expect(answer.body.fields).toHaveLength(1);
    },
  );

  it('answer what the database cannot hold without its words', async () => {
    for (const path of [
      '/api/sites?q=%00',
      `/api/visits/${'x'.repeat(40)}`,
      '/api/sites?after=%22%3B--',
      '/api/visits/%ff',
    ]) {
      const answer = await ours.owner.get(path);
      expect([400, 404, 200]).toContain(answer.status);
      expect(answer.text).not.toMatch(/invalid byte|syntax|column|relation|uuid:/i);
    }
  });
});
