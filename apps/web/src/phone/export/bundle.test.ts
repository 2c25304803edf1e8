import { emptyChain, readBundle, verifyChain } from '@rimeward/delivery';
import { beforeEach, expect, it } from 'vitest';
import { codec } from '../codec';
import { database } from '../database/database';
import { storePhoto } from '../photos/intake';
import { saveEntry } from '../save/save-entry';
import { freshDatabase } from '../testing/fresh-database';
import { enrolTechnician, noteOf } from '../testing/people';
import { exportBundle } from './bundle';

beforeEach(freshDatabase);

it('exports the exact entries and photographs of the active person, of devices left behind too, and of nobody else', async () => {
  await enrolTechnician(2);
  await saveEntry(noteOf(2, 'another person'));
  const old = await enrolTechnician(1, {
    deviceId: '018f6b2a-0000-7000-8000-00000000d0aa',
    leftBehind: true,
  });
  await saveEntry(noteOf(1, 'before the new device: ñ'));
  const device = await enrolTechnician(1);
  const picture = new Uint8Array(300_000).map((_, index) =>
    index < 3 ? [0xff, 0xd8, 0xff][index]! : index % 251,
  );
  const stored = await storePhoto(new Blob([picture]), { role: 'site', takenAt: null, source: 'gallery' });
  if (!stored.ok) throw new Error(stored.fault);
  await saveEntry(noteOf(1, 'with a photograph', [stored.photo]));

  const reading = readBundle(new Uint8Array(await (await exportBundle()).arrayBuffer()));
  expect(reading?.whole).toBe(true);
  expect(reading?.sections[0]?.header.kind).toBe('manifest');
  for (const { deviceId } of [old, device]) {
    const entries = (reading?.sections ?? []).flatMap(({ header, content }) =>
      header.kind === 'entry' && header.device === deviceId
        ? [{ text: new TextDecoder().decode(content), hash: header.hash }]
        : [],
    );
    expect(verifyChain(deviceId, emptyChain, entries, codec)).toMatchObject({ ok: true, head: { seq: 1 } });
  }
  const photos = reading?.sections.filter(({ header }) => header.kind === 'photo') ?? [];
  expect(photos.map(({ content }) => Buffer.compare(Buffer.from(content), picture))).toEqual([0]);
  expect(
    JSON.stringify(reading?.sections.map(({ content }) => new TextDecoder().decode(content))),
  ).not.toContain('another person');
  expect(await database().entries.count()).toBe(3);
});
