import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { extname, join } from 'node:path';
import { emptyChain, readBundle, sealEntry, verifyChain, type Codec } from '@rimeward/delivery';
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { openDeskBrowser } from './support/browser';

const publicFolder = join(import.meta.dirname, '../web/public');
const types: Record<string, string> = { '.html': 'text/html', '.js': 'text/javascript', '.css': 'text/css' };
/** As strict as the product's own, and nothing but the page's own files. */
const policy =
  "default-src 'none'; script-src 'self'; style-src 'self'; require-trusted-types-for 'script'; trusted-types 'none'";

const codec: Codec = {
  utf8: (text) => new TextEncoder().encode(text),
  sha256: (bytes) => new Uint8Array(createHash('sha256').update(bytes).digest()),
};
const device = '018f6b2a-0000-7000-8000-00000000d001';

describe('the rescue page', () => {
  let server: Server;
  let browser: Browser;
  let origin: string;

  beforeAll(async () => {
    server = createServer((request, response) => {
      const path = request.url ?? '/';
      if (!path.startsWith('/rescue.')) {
        response.writeHead(200, { 'content-type': 'text/html' }).end('<!doctype html><title>seed</title>');
        return;
      }
      response.writeHead(200, { 'content-type': types[extname(path)], 'content-security-policy': policy });
      response.end(readFileSync(join(publicFolder, path)));
    });
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
    origin = `http://127.0.0.1:${(server.address() as AddressInfo).port}`;
    browser = await openDeskBrowser();
  });
  afterAll(async () => {
    await browser?.close();
    server?.close();
  });

  async function rescued(
    seed: object | null,
  ): Promise<{ bundle: Uint8Array | null; words: string; databases: number }> {
    const context = await browser.newContext({ acceptDownloads: true });
    const page = await context.newPage();
    const complaints: string[] = [];
    page.on('console', (message) => message.type() === 'error' && complaints.push(message.text()));
    await page.goto(origin);
    if (seed !== null) await page.evaluate(write, JSON.parse(JSON.stringify(seed)) as Seed);
    await page.goto(`${origin}/rescue.html`);
    const download = page.waitForEvent('download', { timeout: 5_000 }).catch(() => null);
    await page.getByRole('button').click();
    const file = await download;
    await page
      .getByRole('status')
      .filter({ hasText: /Saved|could not/ })
      .waitFor();
    const words = await page.getByRole('status').innerText();
    const databases = await page.evaluate(async () => (await indexedDB.databases()).length);
    expect(complaints).toEqual([]);
    const bundle = file === null ? null : new Uint8Array(readFileSync(await file.path()));
    await context.close();
    return { bundle, words, databases };
  }

  it('reads the storage without the app, under a strict policy, into a bundle that verifies', async () => {
    const first = sealEntry({ v: 1, id: device, device, body: { text: 'año' } }, emptyChain, codec);
    const second = sealEntry({ v: 1, id: device, device, body: { text: 'two' } }, first, codec);
    const picture = Array.from({ length: 300_000 }, (_, index) => index % 251);
    const sha256 = createHash('sha256').update(Uint8Array.from(picture)).digest('hex');
    const { bundle, words } = await rescued({
      devices: [{ deviceId: device }],
      entries: [first, second].map(({ seq, text, hash }) => ({ device, seq, text, hash })),
      photos: [{ device, sha256, type: 'image/jpeg', state: 'pending' }],
      chunks: [
        { sha256, n: 0, bytes: picture.slice(0, 262_144) },
        { sha256, n: 1, bytes: picture.slice(262_144) },
      ],
    });
    expect(words).toContain('2 entries, 1 photographs');
    const reading = readBundle(bundle ?? new Uint8Array());
    expect(reading?.whole).toBe(true);
    const entries = (reading?.sections ?? []).flatMap(({ header, content }) =>
      header.kind === 'entry' ? [{ text: new TextDecoder().decode(content), hash: header.hash }] : [],
    );
    expect(verifyChain(device, emptyChain, entries, codec)).toMatchObject({ ok: true, head: { seq: 2 } });
    const photo = reading?.sections.find(({ header }) => header.kind === 'photo');
    expect(
      createHash('sha256')
        .update(photo?.content ?? new Uint8Array())
        .digest('hex'),
    ).toBe(sha256);
  });

  it('makes no storage where there is none, and says that there is none', async () => {
    const { bundle, words, databases } = await rescued(null);
    expect(bundle).toBeNull();
    expect(words).toMatch(/could not be read/);
    expect(databases).toBe(0);
  });
});

interface Seed {
  devices: object[];
  entries: object[];
  photos: object[];
  chunks: { sha256: string; n: number; bytes: number[] }[];
}

/** Runs in the page: writes rows as the app lays them out. */
function write(seed: Seed): Promise<void> {
  return new Promise((resolve, reject) => {
    const request = indexedDB.open('rimeward', 10);
    request.onupgradeneeded = () => {
      const db = request.result;
      db.createObjectStore('devices', { keyPath: 'deviceId' });
      db.createObjectStore('entries', { keyPath: ['device', 'seq'] });
      db.createObjectStore('photos', { keyPath: ['device', 'sha256'] });
      db.createObjectStore('chunks', { keyPath: ['sha256', 'n'] });
    };
    request.onerror = () => reject(new Error('no storage'));
    request.onsuccess = () => {
      const db = request.result;
      const transaction = db.transaction(['devices', 'entries', 'photos', 'chunks'], 'readwrite');
      const chunks = seed.chunks.map((chunk) => ({ ...chunk, bytes: Uint8Array.from(chunk.bytes).buffer }));
      for (const [table, rows] of Object.entries({ ...seed, chunks })) {
        for (const row of rows as object[]) transaction.objectStore(table).put(row);
      }
      transaction.oncomplete = () => {
        db.close();
        resolve();
      };
      transaction.onabort = () => reject(new Error('not written'));
    };
  });
}
