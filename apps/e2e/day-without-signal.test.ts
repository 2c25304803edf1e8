import { createHash } from 'node:crypto';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Client } from 'pg';
import type { Browser, Page } from 'playwright-core';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { deskSize, openDeskBrowser, PhoneBrowser } from './support/browser';
import { keepPicture } from './support/failure';
import { openOffice, type Office } from './support/office';
import { entriesOnPhone, type PhoneEntry } from './support/phone-data';
import { makePicture, type TestPicture } from './support/pictures';
import { installed, signIn } from './support/sign-in';
import { VisitWalk } from './support/visit-walk';

/** The main job, whole: each test takes up where the one before it left off. */
describe('a day without signal', () => {
  const pictureFolder = mkdtempSync(join(tmpdir(), 'rimeward-pictures-'));
  const phone = new PhoneBrowser();
  let office: Office;
  let desk: Browser;
  let deskPage: Page;
  let page: Page;
  let pictures: TestPicture[];
  let visitId: string;
  let saved: PhoneEntry[];

  beforeAll(async () => {
    office = await openOffice('day');
    pictures = [];
    for (let number = 1; number <= 12; number += 1) pictures.push(await makePicture(pictureFolder, number));
    desk = await openDeskBrowser();
  });
  afterEach(async ({ task }) => {
    if (task.result?.state === 'fail') await keepPicture(task.name, { phone: page, desk: deskPage });
  });
  afterAll(async () => {
    await phone.close();
    await desk?.close();
    await office?.close();
    rmSync(pictureFolder, { recursive: true, force: true });
  });

  const take = (count: number): TestPicture[] => pictures.splice(0, count);

  async function outOfRange(): Promise<void> {
    await phone.context.setOffline(true);
  }

  it('brings the day to the phone while there is a signal', async () => {
    for (const picture of pictures) {
      expect(picture.bytes).toBeGreaterThan(2_000_000);
      expect(picture.bytes).toBeLessThan(4_000_000);
    }
    expect(new Set(pictures.map(({ sha256 }) => sha256)).size).toBe(12);
    page = await phone.open();
    await signIn(page, office.product.origin, office.account('Marlo'));
    await page.getByText('Ready for the day').waitFor();
    await installed(page);
  });

  it('starts cold without signal and without an office', async () => {
    await office.product.stopApi();
    await phone.kill();
    page = await phone.open();
    await outOfRange();
    await page.goto(office.product.origin);
    await page
      .getByRole('link', { name: /8 zones/ })
      .first()
      .click();
    await page.getByRole('list', { name: 'All steps' }).waitFor();
    visitId = page.url().split('/visit/')[1] ?? '';
    expect(visitId).toMatch(/^[0-9a-f-]{36}$/);
  });

  it('logs the work before the air, with photographs', async () => {
    const walk = new VisitWalk(page);
    await walk.tap(/Next: Arrive/);
    await walk.tap('We are here');
    await walk.step('Walk-through');
    await walk.choose('Found');
    await walk.attach('Photograph of the part', take(3));
    await walk.choose('Taken out, blank fitted');
    await walk.choose('Truck bin');
    await page.getByText('Taken out, blank fitted · Truck bin').waitFor();
    await page.getByLabel('Where', { exact: true }).fill('Head by the mailbox');
    await page.getByLabel('What is broken').fill('Riser snapped before we came');
    await walk.attach('Damage before work', take(3));
    await walk.tap('Write the damage down');
    await page.getByText('Head by the mailbox: Riser snapped before we came').waitFor();
    await walk.tap('Walk-through done');
    await walk.step('Water off');
    await walk.choose('Closed now');
    await walk.choose('Zone 1');
    await walk.step('Close the backflow valves');
    await walk.tap('All closed');
    await walk.tap('Done');
    await walk.step('Connect the hose');
    await walk.choose('Yes', 'Is it downstream of the backflow assembly?');
    await walk.choose('Yes', 'Are the hose couplings pinned or chained?');
    await walk.tap('Hose is connected');
    await walk.step('Set the regulator');
    await walk.type('50');
    await walk.tap('Regulator is set');
    await walk.step('People clear');
    await walk.tap('People are clear');
    await page.getByRole('list', { name: 'All steps' }).waitFor();
  });

  it('keeps the air running through a dead battery', async () => {
    const walk = new VisitWalk(page);
    await walk.step('Air, zone by zone');
    for (let zone = 1; zone <= 3; zone += 1) {
      await walk.cycle('Spitting');
      await walk.cycle('Mist');
    }
    await walk.tap('Start air');
    await page.getByRole('button', { name: 'Stop air' }).waitFor();
    await phone.kill();
    page = await phone.open();
    await outOfRange();
    await page.goto(`${office.product.origin}/visit/${visitId}`);
    await page.getByRole('button', { name: /Air is on: zone/ }).click();
    const after = new VisitWalk(page);
    await after.tap('Stop air');
    await after.choose('Spitting');
    await after.cycle('Mist');
    for (let zone = 5; zone <= 8; zone += 1) {
      await after.cycle('Spitting');
      await after.cycle('Mist');
    }
    await after.tap('All zones are done');
    await page.getByRole('list', { name: 'All steps' }).waitFor();
  });

  it('leaves the system for the winter', async () => {
    const walk = new VisitWalk(page);
    await walk.step('Compressor and hose off');
    await walk.tap('Compressor is off');
    await walk.tap('Hose pressure is bled');
    await walk.tap('Hose is off');
    await walk.step('Backflow: winter position');
    await walk.attach('Photograph of the assembly', take(4));
    await walk.tap('All worked and half open');
    await walk.tap('Done');
    await walk.step('Drains');
    for (const tile of await page.getByRole('radio', { name: 'Ran dry, closed again' }).all())
      await tile.click();
    await walk.choose('Plug or cap is back on');
    await walk.choose('Off', 'Controller off');
    await walk.tap('Done');
    await page.getByRole('link', { name: 'Defects and notes' }).click();
    await page.getByLabel('Where', { exact: true }).fill('Zone 3');
    await page.getByLabel('What is wrong').fill('Rotor does not turn');
    await walk.attach('Photograph of the defect', take(2));
    await walk.tap('Write the defect down');
    await page.getByText('Zone 3: Rotor does not turn').waitFor();
    await walk.back();
    await walk.step('Leave');
    await walk.choose('All done');
    await walk.choose('Nobody present');
    await walk.tap('Leave the site');
    await page.getByRole('list', { name: 'All steps' }).waitFor();
    saved = await entriesOnPhone(page);
    expect(saved.length).toBeGreaterThan(60);
  });

  it('delivers everything when the truck is back in range', async () => {
    await office.product.startApi();
    // The session has ended meanwhile: the phone's own credential brings the log in all the same.
    await phone.context.clearCookies();
    await phone.context.setOffline(false);
    await page.goto(`${office.product.origin}/on-this-phone`);
    await page.getByRole('button', { name: 'Deliver now' }).click();
    await page.getByText('Nothing waits on this phone.').waitFor({ timeout: 120_000 });
  });

  it('shows the supervisor every entry and every photograph byte for byte', async () => {
    const context = await desk.newContext({
      viewport: deskSize,
      locale: 'en-US',
      timezoneId: 'America/Denver',
    });
    deskPage = await context.newPage();
    await signIn(deskPage, office.product.origin, office.account('Nadine'));
    await deskPage.waitForURL('**/review');
    await deskPage.goto(`${office.product.origin}/review/${visitId}`);
    const corrections = saved.filter(
      ({ text }) => (JSON.parse(text) as { type: string }).type === 'corrected',
    ).length;
    await expect
      .poll(() => deskPage.locator('[data-entry]').count(), { timeout: 60_000, interval: 250 })
      .toBe(saved.length - corrections);
    await deskPage.getByText('Photographs (12)').waitFor();
    const named = saved.flatMap(({ text }) => (JSON.parse(text) as { photos: { sha256: string }[] }).photos);
    expect(named).toHaveLength(12);
    for (const { sha256 } of named) {
      const hash = await deskPage.evaluate(async (id) => {
        const response = await fetch(`/api/photos/${id}/original`);
        const digest = await crypto.subtle.digest('SHA-256', await response.arrayBuffer());
        return [...new Uint8Array(digest)].map((byte) => byte.toString(16).padStart(2, '0')).join('');
      }, sha256);
      expect(hash).toBe(sha256);
    }
  });

  it('is sent back, answered and accepted', async () => {
    await deskPage.getByRole('button', { name: 'Add a question' }).click();
    await deskPage.getByLabel('Question to the technician').fill('Which head of zone 3 does not turn?');
    await deskPage.getByRole('button', { name: 'Send back' }).click();
    await deskPage.getByText('Sent back by Nadine').waitFor();
    await page.getByRole('link', { name: 'Sign in again', exact: true }).click();
    const { email, password } = office.account('Marlo');
    await page.getByLabel('E-mail').fill(email);
    await page.getByLabel('Password', { exact: true }).fill(password);
    await page.getByRole('button', { name: 'Sign in' }).click();
    await page.waitForURL('**/on-this-phone');
    await page.getByRole('button', { name: 'Deliver now' }).click();
    await page.goto(`${office.product.origin}/today`);
    await page.getByText('Sent back: 1 question').waitFor({ timeout: 60_000 });
    await page
      .getByRole('link', { name: /8 zones/ })
      .first()
      .click();
    await page.getByLabel('Your answer').fill('The one beside the walk');
    await page.getByRole('button', { name: 'Write the answer down' }).click();
    await page.getByText('Answered: The one beside the walk').waitFor();
    await page.goto(`${office.product.origin}/on-this-phone`);
    await page.getByRole('button', { name: 'Deliver now' }).click();
    await page.getByText('Nothing waits on this phone.').waitFor({ timeout: 60_000 });
    await deskPage.reload();
    await deskPage.getByText('Answer: The one beside the walk').waitFor();
    await deskPage.getByRole('button', { name: 'Accept', exact: true }).click();
    await deskPage.getByText('Accepted by Nadine').waitFor();
  });

  it('agrees with what PostgreSQL holds: count, bytes, hashes, chain', async () => {
    const onPhone = (await entriesOnPhone(page)).sort((one, other) => one.seq - other.seq);
    const device = onPhone[0]?.device;
    const client = new Client({ connectionString: office.product.adminDatabaseUrl });
    await client.connect();
    const stored = await client.query<{
      seq: number;
      bytes: Buffer;
      hash: Buffer;
      prev: Buffer;
      held_reason: string | null;
    }>('select seq, bytes, hash, prev, held_reason from log_entries where device_id = $1 order by seq', [
      device,
    ]);
    const photos = await client.query<{ n: number }>(
      'select count(*)::int as n from photos where bytes > 2000000',
    );
    await client.end();
    expect(stored.rows.map(({ seq }) => seq)).toEqual(onPhone.map(({ seq }) => seq));
    expect(stored.rows.map(({ bytes }) => bytes.toString('utf8'))).toEqual(onPhone.map(({ text }) => text));
    expect(stored.rows.every(({ held_reason }) => held_reason === null)).toBe(true);
    let previous = Buffer.alloc(32);
    for (const [index, row] of stored.rows.entries()) {
      expect(row.prev.equals(previous)).toBe(true);
      previous = createHash('sha256').update(previous).update(row.bytes).digest();
      expect(row.hash.equals(previous)).toBe(true);
      expect(previous.toString('hex')).toBe(onPhone[index]?.hash);
    }
    expect(photos.rows[0]?.n).toBe(12);
  });
});
