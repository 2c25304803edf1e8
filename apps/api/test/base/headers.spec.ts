import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { request } from 'node:http';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { brotliCompressSync, brotliDecompressSync, gzipSync, gunzipSync } from 'node:zlib';
import { createTestApp, type TestApp } from '../support/test-app';

const page =
  '<!doctype html><title>Rimeward</title><script type="module" src="/assets/main-a1b2.js"></script>';
const script = `console.log(${JSON.stringify('x'.repeat(3_000))})`;
const style = `.a{color:#14211c}${'/* filling */'.repeat(300)}`;

/** Headers that speak of the content, the time or the connection. */
const ofTheContent = new Set(
  'date connection keep-alive etag last-modified content-length content-type cache-control accept-ranges vary transfer-encoding'.split(
    ' ',
  ),
);

interface Raw {
  status: number;
  headers: Record<string, string | string[] | undefined>;
  body: Buffer;
}

describe('what the server sends', () => {
  let test: TestApp;
  const web = mkdtempSync(join(tmpdir(), 'rimeward-web-'));

  beforeAll(async () => {
    mkdirSync(join(web, 'assets'));
    writeFileSync(join(web, 'index.html'), page);
    writeFileSync(join(web, 'sw.js'), 'self.skipWaiting;');
    writeFileSync(join(web, 'manifest.webmanifest'), '{}');
    writeFileSync(join(web, 'assets/main-a1b2.js'), script);
    writeFileSync(join(web, 'assets/main-a1b2.js.br'), brotliCompressSync(script));
    writeFileSync(join(web, 'assets/main-a1b2.js.gz'), gzipSync(script));
    writeFileSync(join(web, 'assets/main-a1b2.js.map'), '{"sources":["secret.ts"]}');
    writeFileSync(join(web, 'assets/main-a1b2.css'), style);
    test = await createTestApp({ WEB_DIST_DIR: web });
  });

  afterAll(async () => {
    await test.close();
    rmSync(web, { recursive: true });
  });

  /** Unlike fetch it neither tidies the path nor unpacks the body. */
  const get = (path: string, headers: Record<string, string> = {}, method = 'GET'): Promise<Raw> =>
    new Promise((resolve, reject) => {
      const { hostname, port } = new URL(test.url);
      const sent = request({ hostname, port, path, headers, method }, (answer) => {
        const chunks: Buffer[] = [];
        answer.on('data', (chunk: Buffer) => chunks.push(chunk));
        answer.on('end', () =>
          resolve({ status: answer.statusCode ?? 0, headers: answer.headers, body: Buffer.concat(chunks) }),
        );
      });
      sent.on('error', reject);
      sent.end();
    });

  it('guards every answer with the same headers, and says nothing of what it runs on', async () => {
    const answers = await Promise.all(
      ['/', '/api/health', '/api/nothing', '/assets/main-a1b2.js'].map((path) => get(path)),
    );
    const guards = answers.map(({ headers }) =>
      Object.fromEntries(Object.entries(headers).filter(([name]) => !ofTheContent.has(name))),
    );
    expect(guards[0]).toMatchInlineSnapshot(`
     {
       "content-security-policy": "default-src 'none';script-src 'self';style-src 'self' 'sha256-47DEQpj8HBSa+/TImW+5JCeuQeRkm5NMpJWZG3hSuFU=';img-src 'self' blob: data:;font-src 'self';connect-src 'self';manifest-src 'self';worker-src 'self';base-uri 'none';form-action 'self';frame-ancestors 'none';object-src 'none';require-trusted-types-for 'script';trusted-types rimeward",
       "cross-origin-opener-policy": "same-origin",
       "cross-origin-resource-policy": "same-origin",
       "origin-agent-cluster": "?1",
       "permissions-policy": "camera=(self), geolocation=(self), microphone=(), payment=(), usb=()",
       "referrer-policy": "no-referrer",
       "strict-transport-security": "max-age=63072000; includeSubDomains",
       "x-content-type-options": "nosniff",
       "x-dns-prefetch-control": "off",
       "x-download-options": "noopen",
       "x-frame-options": "DENY",
       "x-permitted-cross-domain-policies": "none",
       "x-xss-protection": "0",
     }
    `);
    for (const others of guards.slice(1)) expect(others).toEqual(guards[0]);
  });

  it('opens the application at every address that is not the API’s or a file’s', async () => {
    for (const path of ['/', '/today', '/visit/1234', '/review?standing=to-review']) {
      const answer = await get(path);
      expect([path, answer.status, answer.body.toString()]).toEqual([path, 200, page]);
      expect(answer.headers['cache-control']).toBe('no-cache');
      expect(answer.headers['content-type']).toBe('text/html; charset=utf-8');
    }
    for (const path of [
      '/api/nothing',
      '/api',
      '/missing.js',
      '/assets/gone-1.js',
      '/assets/main-a1b2.js.map',
      '/assets/main-a1b2.js.br',
    ]) {
      const answer = await get(path);
      expect([path, answer.status]).toEqual([path, 404]);
      expect(answer.headers['content-type']).toContain('application/problem+json');
    }
  });

  it('serves hashed files for ever, and the worker and the manifest anew each time', async () => {
    expect((await get('/assets/main-a1b2.js')).headers['cache-control']).toBe(
      'public, max-age=31536000, immutable',
    );
    expect((await get('/sw.js')).headers['cache-control']).toBe('no-cache');
    const manifest = await get('/manifest.webmanifest');
    expect(manifest.headers).toMatchObject({
      'cache-control': 'no-cache',
      'content-type': 'application/manifest+json',
    });
    const { etag } = (await get('/sw.js')).headers;
    expect((await get('/sw.js', { 'If-None-Match': String(etag) })).status).toBe(304);
  });

  it('sends what was compressed beforehand, in what the browser takes', async () => {
    const path = '/assets/main-a1b2.js';
    const brotli = await get(path, { 'Accept-Encoding': 'gzip, br' });
    expect(brotli.headers).toMatchObject({
      'content-encoding': 'br',
      'content-type': 'text/javascript; charset=utf-8',
      vary: 'Accept-Encoding',
    });
    expect(brotliDecompressSync(brotli.body).toString()).toBe(script);
    const gzip = await get(path, { 'Accept-Encoding': 'gzip' });
    expect(gunzipSync(gzip.body).toString()).toBe(script);
    expect((await get(path)).body.toString()).toBe(script);
  });

  it('compresses what was not', async () => {
    const answer = await get('/assets/main-a1b2.css', { 'Accept-Encoding': 'gzip' });
    expect(answer.headers['content-encoding']).toBe('gzip');
    expect(gunzipSync(answer.body).toString()).toBe(style);
  });

  it('stays inside its folder', async () => {
    for (const path of [
      '/../package.json',
      '/assets/../../package.json',
      '/%2e%2e/package.json',
      '/assets/%2e%2e%2f%2e%2e%2fpackage.json',
      '//etc/passwd',
      '/.env',
      '/.git/config',
      '/%00',
    ]) {
      const { status, body } = await get(path);
      expect([path, status === 404 || body.toString() === page || status === 400]).toEqual([path, true]);
    }
  });

  it('keeps answers of the API out of every cache', async () => {
    for (const path of ['/api/health', '/api/visits?from=2026-01-01&to=2026-01-02', '/api/nothing']) {
      expect((await get(path)).headers['cache-control']).toBe('no-store');
    }
  });
});
