import { addCompany, type TestCompany } from '../support/company';
import { TestBrowser } from '../support/browser';
import { createTestApp, publicOrigin, type TestApp } from '../support/test-app';

describe('requests that change something', () => {
  let test: TestApp;
  let company: TestCompany;
  let browser: TestBrowser;

  beforeAll(async () => {
    test = await createTestApp();
    company = await addCompany(test.database, 'Fern');
    browser = await TestBrowser.of(test, company.people.owner);
  });

  afterAll(() => test.close());

  const language = async (): Promise<unknown> =>
    ((await browser.get('/api/auth/session')).body.user as { language: string }).language;
  const change = (headers: Record<string, string>, body = '{"language":"es"}') =>
    browser.send('PATCH', '/api/users/me', headers, body);
  const json = { 'Content-Type': 'application/json' };

  it.each([
    [
      'a form of another site',
      { 'Content-Type': 'application/x-www-form-urlencoded', Origin: 'https://evil.example' },
      403,
    ],
    ['JSON sent as plain text', { 'Content-Type': 'text/plain' }, 415],
    ['a foreign origin with our header', { ...json, Origin: 'https://evil.example' }, 403],
    ['an origin that only begins like ours', { ...json, Origin: `${publicOrigin}.evil.example` }, 403],
    ['the origin of a sandboxed frame', { ...json, Origin: 'null' }, 403],
    ['no header of ours', { ...json, 'X-Rimeward-Request': '' }, 403],
    [
      'no header of ours and a foreign origin',
      { ...json, 'X-Rimeward-Request': '', Origin: 'https://evil.example' },
      403,
    ],
    [
      'a form with parts and no header of ours',
      { 'Content-Type': 'multipart/form-data; boundary=x', 'X-Rimeward-Request': '' },
      403,
    ],
  ])('are refused from %s', async (_, headers, status) => {
    expect((await change(headers)).status).toBe(status);
    expect(await language()).toBe('en');
  });

  it('are taken from our own pages', async () => {
    expect((await change({ ...json, Origin: publicOrigin })).status).toBe(204);
    expect(await language()).toBe('es');
    expect((await change({ ...json, Origin: publicOrigin }, '{"language":"en"}')).status).toBe(204);
  });

  it('are refused without a session whatever they say', async () => {
    const stranger = await new TestBrowser(test).send(
      'PATCH',
      '/api/users/me',
      { ...json, Origin: publicOrigin },
      '{}',
    );
    expect(stranger.body.code).toBe('not-signed-in');
  });

  it('never happen by reading', async () => {
    for (const path of ['/api/auth/sign-out', '/api/auth/renew', '/api/users/me', '/api/devices']) {
      expect((await browser.get(path)).status).toBe(404);
    }
  });

  it('are too large past one megabyte, and malformed when they are no JSON', async () => {
    const large = await change(json, JSON.stringify({ language: 'x'.repeat(1_100_000) }));
    expect([large.status, large.body.code]).toEqual([413, 'payload-too-large']);
    const malformed = await change(json, '{"language":');
    expect([malformed.status, malformed.body.code]).toEqual([400, 'bad-request']);
    const odd = await change(json, '{"language":"fr","role":"owner"}');
    expect(odd.body).toMatchObject({
      code: 'validation-failed',
      fields: [{ path: 'language' }, { path: '' }],
    });
  });
});
