import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { Page } from 'playwright-core';

/** After a failed test: what its pages showed, as pictures whose paths are printed. */
export async function keepPicture(test: string, pages: Record<string, Page | undefined>): Promise<void> {
  for (const [name, page] of Object.entries(pages)) {
    if (!page || page.isClosed()) continue;
    const path = join(tmpdir(), `rimeward-failed-${name}-${test.replaceAll(/\W+/g, '-').slice(0, 60)}.png`);
    try {
      await page.screenshot({ path, timeout: 5_000 });
      console.log(`${name} at ${page.url()}: ${path}`);
    } catch (error) {
      console.log(`${name} could not be pictured: ${String(error)}`);
    }
  }
}
