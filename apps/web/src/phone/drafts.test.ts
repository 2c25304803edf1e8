import { beforeEach, expect, it } from 'vitest';
import { lockOnSignOut } from './device/sign-out';
import { dropDraft, openDraftKeys, readDraft, writeDraft } from './drafts';
import { closeIntent, openIntent, pendingIntents } from './intents';
import { freshDatabase } from './testing/fresh-database';
import { enrolTechnician, visitId } from './testing/people';

beforeEach(async () => {
  freshDatabase();
  await enrolTechnician(1);
});

it('keeps what was typed for the one who typed it, through sign-out, until it is dropped', async () => {
  await writeDraft(`visit/${visitId}/note`, { text: 'half a sen' });
  await writeDraft(`visit/${visitId}/note`, { text: 'half a sentence' });
  await writeDraft('other', 1);
  await enrolTechnician(2);
  expect(await readDraft(`visit/${visitId}/note`)).toBeNull();
  expect(await openDraftKeys()).toEqual([]);
  await lockOnSignOut();
  await enrolTechnician(1);
  expect(await readDraft(`visit/${visitId}/note`)).toEqual({ text: 'half a sentence' });
  expect(await openDraftKeys('visit/')).toEqual([`visit/${visitId}/note`]);
  await dropDraft(`visit/${visitId}/note`);
  expect(await openDraftKeys()).toEqual(['other']);
});

it('remembers for which field the camera was opened when the page is killed meanwhile', async () => {
  const id = await openIntent({ visit: visitId, field: 'damage', detail: { place: 'gate' } });
  await openIntent({ visit: visitId, field: 'plug' });
  await enrolTechnician(2);
  expect(await pendingIntents()).toEqual([]);
  await enrolTechnician(1);
  expect((await pendingIntents()).map(({ field }) => field).sort()).toEqual(['damage', 'plug']);
  await closeIntent(id);
  expect((await pendingIntents()).map(({ field }) => field)).toEqual(['plug']);
});
