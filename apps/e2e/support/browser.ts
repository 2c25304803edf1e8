import { spawn, type ChildProcess } from 'node:child_process';
import { existsSync, mkdtempSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { chromium, type Browser, type BrowserContext, type Page } from 'playwright-core';

const executablePath = process.env['CHROMIUM_PATH'] ?? '/usr/bin/chromium';

export const phoneSize = { width: 390, height: 844 };
export const deskSize = { width: 1440, height: 900 };

const flags = [
  '--headless=new',
  '--no-sandbox',
  '--disable-gpu',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
  '--disable-dev-shm-usage',
  '--lang=en-US',
  '--remote-debugging-port=0',
];

/** A browser of our own with a profile that outlives it, so that it can be killed like a phone whose battery dies. */
export class PhoneBrowser {
  readonly profile = mkdtempSync(join(tmpdir(), 'rimeward-phone-'));
  private child: ChildProcess | null = null;
  private browser: Browser | null = null;

  async open(size = phoneSize): Promise<Page> {
    const portFile = join(this.profile, 'DevToolsActivePort');
    rmSync(portFile, { force: true });
    this.child = spawn(executablePath, [...flags, `--user-data-dir=${this.profile}`, 'about:blank'], {
      stdio: 'ignore',
      env: { ...process.env, TZ: 'America/Denver' },
    });
    const port = await waitFor(() =>
      existsSync(portFile) ? readFileSync(portFile, 'utf8').split('\n')[0] : undefined,
    );
    this.browser = await chromium.connectOverCDP(`http://127.0.0.1:${port}`);
    const page = this.context.pages()[0] ?? (await this.context.newPage());
    await page.setViewportSize(size);
    return page;
  }

  get context(): BrowserContext {
    const context = this.browser?.contexts()[0];
    if (!context) throw new Error('The browser is not open');
    return context;
  }

  /** The battery dies. */
  async kill(): Promise<void> {
    const child = this.child;
    if (!child) return;
    this.child = null;
    const gone = new Promise((resolve) => child.once('exit', resolve));
    child.kill('SIGKILL');
    await gone;
    this.browser = null;
  }

  async close(): Promise<void> {
    await this.browser?.close().catch(() => undefined);
    await this.kill();
    rmSync(this.profile, { recursive: true, force: true, maxRetries: 20, retryDelay: 250 });
  }
}

async function waitFor<T>(look: () => T | undefined): Promise<T> {
  for (let tries = 0; tries < 200; tries += 1) {
    const found = look();
    if (found) return found;
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  throw new Error('The browser did not start');
}

export function openDeskBrowser(): Promise<Browser> {
  return chromium.launch({ executablePath, chromiumSandbox: false, args: ['--disable-dev-shm-usage'] });
}
