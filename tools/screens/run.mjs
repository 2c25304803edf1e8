import { mkdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { chromium } from 'playwright-core';
import { build } from '../lib/build.mjs';
import { root } from '../lib/paths.mjs';
import { run, say } from '../lib/say.mjs';
import { startCluster } from '../postgres/cluster.mjs';
import { startProduct } from '../product/product.mjs';

const sizes = { phone: { width: 390, height: 844 }, desk: { width: 1440, height: 900 } };
const steps = [
  'arrive',
  'walk-through',
  'water-off',
  'backflow-before-air',
  'connect',
  'regulator',
  'people-clear',
  'air',
  'close-down',
  'backflow-winter',
  'drains',
  'leave',
  'defects',
  'log',
  'site',
];

/** Pictures of every screen with the demo company, at phone and desk size, in both languages, into docs/screens. */
run(async () => {
  await build();
  const dataDir = join(root, '.data', 'screens');
  rmSync(dataDir, { recursive: true, force: true });
  const cluster = await startCluster({ dataDir, superPassword: 'postgres-for-screens', durable: false });
  const product = await startProduct({ adminUrl: cluster.adminUrl, dataDir, seedDemo: true });
  const browser = await chromium.launch({ executablePath: '/usr/bin/chromium', chromiumSandbox: false });
  const folder = join(root, 'docs', 'screens');
  mkdirSync(folder, { recursive: true });
  try {
    for (const language of ['en', 'es']) {
      for (const [size, viewport] of Object.entries(sizes)) {
        const shoot = (page, name) =>
          page.screenshot({ path: join(folder, `${name}.${size}.${language}.png`) });
        await phoneScreens(browser, product, { language, viewport, shoot });
        await deskScreens(browser, product, { language, viewport, shoot });
      }
    }
    await modeScreens(browser, product, folder);
    say(`Pictures are in ${folder}.`);
  } finally {
    await browser.close();
    await product.discard();
    await cluster.stop();
    rmSync(cluster.folder, { recursive: true, force: true });
  }
});

async function open(browser, product, { language, viewport }, who, preferences = {}) {
  const context = await browser.newContext({
    viewport,
    locale: language === 'es' ? 'es-US' : 'en-US',
    timezoneId: 'America/Denver',
  });
  await context.addInitScript(
    ([kept, chosen]) => {
      localStorage.setItem('rimeward.preferences', kept);
      localStorage.setItem('rimeward.language', chosen);
    },
    [JSON.stringify(preferences), language],
  );
  const page = await context.newPage();
  await page.goto(product.origin);
  const { email, password } = product.accounts.find(({ name }) => name.startsWith(who));
  const form = page.locator('form');
  await form.waitFor();
  const signIn = async () => {
    await form.locator('input').nth(0).fill(email);
    await form.locator('input').nth(1).fill(password);
    await form.locator('button[type=submit]').click();
  };
  return { page, signIn };
}

async function phoneScreens(browser, product, { language, viewport, shoot }) {
  const { page, signIn } = await open(browser, product, { language, viewport }, 'Marlo');
  await shoot(page, 'sign-in');
  await signIn();
  await page.locator('ol a').first().waitFor();
  await shoot(page, 'today');
  const visit = await page.locator('ol a').first().getAttribute('href');
  for (const step of ['', ...steps.map((name) => `/${name}`)]) {
    await page.goto(`${product.origin}${visit}${step}`);
    await page.locator('main').waitFor();
    await page.waitForTimeout(400);
    await shoot(page, step === '' ? 'visit' : `visit-${step.slice(1)}`);
  }
  for (const [path, name] of [
    ['/on-this-phone', 'on-this-phone'],
    ['/settings', 'settings'],
  ]) {
    await page.goto(product.origin + path);
    await page.locator('main').waitFor();
    await page.waitForTimeout(400);
    await shoot(page, name);
  }
  await page.context().close();
}

async function deskScreens(browser, product, { language, viewport, shoot }) {
  const { page, signIn } = await open(browser, product, { language, viewport }, 'Nadine');
  await signIn();
  await page.locator('tbody a').first().waitFor();
  await page.waitForTimeout(800);
  await shoot(page, 'review');
  await page.locator('tbody a').first().click();
  await page.locator('[data-entries]').waitFor();
  await page.waitForTimeout(1_200);
  await shoot(page, 'visit-record');
  await page.context().close();
}

/** The air screen and Today in the other two display modes. */
async function modeScreens(browser, product, folder) {
  for (const mode of ['night', 'sun']) {
    const { page, signIn } = await open(
      browser,
      product,
      { language: 'en', viewport: sizes.phone },
      'Marlo',
      { mode },
    );
    await signIn();
    await page.locator('ol a').first().waitFor();
    const visit = await page.locator('ol a').first().getAttribute('href');
    await page.screenshot({ path: join(folder, `today.phone.en.${mode}.png`) });
    await page.goto(`${product.origin}${visit}/air`);
    await page.locator('main').waitFor();
    await page.waitForTimeout(400);
    await page.screenshot({ path: join(folder, `visit-air.phone.en.${mode}.png`) });
    await page.context().close();
  }
}
