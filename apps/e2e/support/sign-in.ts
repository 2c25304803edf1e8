import type { Page } from 'playwright-core';

export async function signIn(
  page: Page,
  origin: string,
  who: { email: string; password: string },
): Promise<void> {
  await page.goto(origin);
  await page.getByLabel('E-mail').fill(who.email);
  await page.getByLabel('Password', { exact: true }).fill(who.password);
  await page.getByRole('button', { name: 'Sign in' }).click();
}

/** Until the application itself is on the phone: the worker controls the page and everything is cached. */
export async function installed(page: Page): Promise<void> {
  await page.waitForFunction(async () => {
    const registration = await navigator.serviceWorker.ready;
    return registration.active?.state === 'activated' && navigator.serviceWorker.controller !== null;
  });
}
