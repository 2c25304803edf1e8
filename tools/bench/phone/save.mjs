// Saving one entry in a real Chromium against a bare strict put of the same row in the same run. Prints ratios; the aim is
// a p50 of at most 1.5 times the bare put, and no growth from 0 to 20,000 entries.
import { mkdtemp, readFile, rm } from 'node:fs/promises';
import { createServer } from 'node:http';
import { tmpdir } from 'node:os';
import { extname, join } from 'node:path';
import { chromium } from 'playwright-core';
import { build } from 'vite';

const types = { '.html': 'text/html', '.js': 'text/javascript' };
const entries = Number(process.env.BENCH_ENTRIES ?? 20_000);
const samples = Number(process.env.BENCH_SAMPLES ?? 400);

const folder = await mkdtemp(join(tmpdir(), 'rimeward-bench-phone-'));
await build({
  root: join(import.meta.dirname, 'page'),
  configFile: false,
  logLevel: 'error',
  resolve: { conditions: ['source', 'module', 'browser', 'production'] },
  build: { outDir: join(folder, 'site'), emptyOutDir: true, target: 'es2022' },
});
const server = createServer(async (request, response) => {
  const path = request.url === '/' ? '/index.html' : (request.url ?? '');
  try {
    const body = await readFile(join(folder, 'site', path));
    response.writeHead(200, { 'content-type': types[extname(path)] ?? 'application/octet-stream' }).end(body);
  } catch {
    response.writeHead(404).end();
  }
}).listen(0, '127.0.0.1');
await new Promise((resolve) => server.once('listening', resolve));

// A profile on disk: an incognito profile keeps IndexedDB in memory, where strict means nothing.
const context = await chromium.launchPersistentContext(join(folder, 'profile'), {
  executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
  chromiumSandbox: process.getuid?.() !== 0,
});
const quantile = (values, q) => [...values].sort((a, b) => a - b)[Math.floor(values.length * q)];
const summary = ({ save, bare }) => ({
  saveMs: quantile(save, 0.5),
  saveP95Ms: quantile(save, 0.95),
  bareMs: quantile(bare, 0.5),
  ratio: quantile(save, 0.5) / quantile(bare, 0.5),
});
const print = (when, { saveMs, saveP95Ms, bareMs, ratio }) =>
  console.log(
    `${when}: save p50 ${saveMs.toFixed(2)} ms, p95 ${saveP95Ms.toFixed(2)} ms; bare strict put p50 ${bareMs.toFixed(2)} ms; ratio ${ratio.toFixed(2)}`,
  );
try {
  const page = await context.newPage();
  await page.goto(`http://127.0.0.1:${server.address().port}/`);
  await page.waitForFunction(() => 'bench' in globalThis);
  await page.evaluate(() => globalThis.bench.measure(100));
  const few = summary(await page.evaluate((count) => globalThis.bench.measure(count), samples));
  print('few entries', few);
  await page.evaluate((total) => globalThis.bench.fillTo(total), entries);
  const many = summary(await page.evaluate((count) => globalThis.bench.measure(count), samples));
  print(`${entries} entries`, many);
  console.log(`growth of the ratio from few to ${entries} entries: ${(many.ratio / few.ratio).toFixed(2)}`);
} finally {
  await context.close();
  server.close();
  await rm(folder, { recursive: true, force: true });
}
