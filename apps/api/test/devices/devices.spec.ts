import { leaseClaimsSchema } from '@rimeward/contracts';
import type { webcrypto } from 'node:crypto';
import { rowsOf } from '../support/admin';
import { addCompany, type TestCompany } from '../support/company';
import { TestBrowser } from '../support/browser';
import { createTestApp, type TestApp } from '../support/test-app';

describe('a phone', () => {
  let test: TestApp;
  let company: TestCompany;
  let technician: TestBrowser;

  beforeAll(async () => {
    test = await createTestApp();
    company = await addCompany(test.database, 'Heath');
    technician = await TestBrowser.of(test, company.people.technician);
  });

  afterAll(() => test.close());

  interface Enrolled {
    deviceId: string;
    ingestSecret: string;
    lease: string;
    verifyKey: webcrypto.JsonWebKey;
  }
  const enrol = async (): Promise<Enrolled> =>
    (await technician.post('/api/devices', { name: 'My phone', platform: 'test' }))
      .body as unknown as Enrolled;
  const push = (deviceId: string, secret: string) =>
    new TestBrowser(test).post(
      '/api/sync/push',
      {
        device: deviceId,
        manifest: {
          head: 0,
          pendingEntries: 0,
          pendingPhotos: 0,
          pendingBytes: 0,
          oldestPendingWall: null,
          appVersion: 'test',
        },
        entries: [],
      },
      { Authorization: `Device ${deviceId}.${secret}` },
    );

  it('gets a secret once, of which the office keeps a hash only', async () => {
    const { deviceId, ingestSecret } = await enrol();
    expect(Buffer.from(ingestSecret, 'base64url')).toHaveLength(32);
    const rows = await rowsOf<object>(test.database.adminUrl, 'select * from devices where id = $1', [
      deviceId,
    ]);
    expect(rows).toHaveLength(1);
    expect(JSON.stringify(rows)).not.toContain(ingestSecret);
  });

  it('gets a lease of 72 hours that any browser can check with the key beside it', async () => {
    const { deviceId, lease, verifyKey } = await enrol();
    expect(verifyKey).not.toHaveProperty('d');
    const [head = '', payload = '', signature = ''] = lease.split('.');
    // Web Crypto takes ECDSA signatures as RFC 7518 section 3.4 writes them, and nothing else.
    const key = await crypto.subtle.importKey(
      'jwk',
      verifyKey,
      { name: 'ECDSA', namedCurve: 'P-256' },
      false,
      ['verify'],
    );
    const check = (text: string): Promise<boolean> =>
      crypto.subtle.verify(
        { name: 'ECDSA', hash: 'SHA-256' },
        key,
        Buffer.from(signature, 'base64url'),
        Buffer.from(text),
      );
    expect(await check(`${head}.${payload}`)).toBe(true);
    expect(JSON.parse(Buffer.from(head, 'base64url').toString())).toEqual({ alg: 'ES256', typ: 'JWT' });
    const claims = leaseClaimsSchema.parse(JSON.parse(Buffer.from(payload, 'base64url').toString()));
    expect(claims).toMatchObject({
      sub: company.people.technician.id,
      company: company.id,
      device: deviceId,
    });
    expect(claims.exp - claims.iat).toBe(72 * 3_600);
    const longer = Buffer.from(JSON.stringify({ ...claims, exp: claims.exp + 1 })).toString('base64url');
    expect(await check(`${head}.${longer}`)).toBe(false);
  });

  it('is known by id and secret together', async () => {
    const one = await enrol();
    const other = await enrol();
    expect((await push(one.deviceId, one.ingestSecret)).status).toBe(200);
    expect((await push(one.deviceId, other.ingestSecret)).body.code).toBe('device-unknown');
    expect((await push(one.deviceId, `${one.ingestSecret}x`)).body.code).toBe('device-unknown');
    expect((await push(one.deviceId.toUpperCase(), one.ingestSecret)).body.code).toBe('device-unknown');
  });

  it('is renewed for its own person only', async () => {
    const { deviceId } = await enrol();
    const again = await technician.post(`/api/devices/${deviceId}/lease`);
    expect(again.status).toBe(200);
    const colleague = await TestBrowser.of(test, company.people.secondTechnician);
    expect((await colleague.post(`/api/devices/${deviceId}/lease`)).body.code).toBe('not-found');
  });

  it('gets no lease once it is withdrawn, and may still deliver', async () => {
    const { deviceId, ingestSecret } = await enrol();
    expect((await technician.post(`/api/devices/${deviceId}/revoke`)).body.code).toBe('not-allowed');
    const supervisor = await TestBrowser.of(test, company.people.supervisor);
    expect((await supervisor.post(`/api/devices/${deviceId}/revoke`)).status).toBe(204);
    expect((await technician.post(`/api/devices/${deviceId}/lease`)).body.code).toBe('device-revoked');
    expect((await push(deviceId, ingestSecret)).status).toBe(200);
  });

  it('is refused without a name', async () => {
    const answer = await technician.post('/api/devices', { name: '', platform: 'test' });
    expect(answer.body).toMatchObject({
      code: 'validation-failed',
      fields: [{ path: 'name', fault: 'too-short' }],
    });
  });
});
