import { bundleFirstLine, sectionEnd, sectionLine } from '@rimeward/delivery';
import { appVersion } from '../app-version';
import { database, type PhoneDatabase } from '../database/database';
import type { EntryRow, PhotoRow } from '../database/schema';
import { activeEnrolment } from '../device/enrolment';
import { originalBytes } from '../photos/chunks';

/**
 * Everything that the active person has on this phone, in one file (see FORMAT.md): all kept entries of all of his devices,
 * and every photograph that the office does not have. Reads one photograph at a time.
 */
export async function exportBundle(db: PhoneDatabase = database()): Promise<Blob> {
  const owner = (await activeEnrolment(db))?.owner;
  const devices = owner === undefined ? [] : await db.devices.where({ owner }).primaryKeys();
  const parts: BlobPart[] = [bundleFirstLine, manifestSection(devices)];
  for (const device of devices) {
    await db.entries
      .where('[device+seq]')
      .between([device, 0], [device, Infinity])
      .each((row) => {
        parts.push(...entrySection(row));
      });
  }
  for (const photo of await db.photos.where('device').anyOf(devices).toArray()) {
    if (photo.state !== 'complete' && photo.state !== 'storing')
      parts.push(...(await photoSection(db, photo)));
  }
  return new Blob(parts, { type: 'application/octet-stream' });
}

/** Hands the bundle to the person as a download. */
export async function downloadBundle(): Promise<void> {
  const address = URL.createObjectURL(await exportBundle());
  const link = document.createElement('a');
  link.href = address;
  link.download = `rimeward-${new Date().toISOString().slice(0, 10)}.bundle`;
  link.click();
  // The browser has taken the file over by then; at once is too early in one engine.
  setTimeout(() => URL.revokeObjectURL(address), 60_000);
}

function manifestSection(devices: readonly string[]): Blob {
  const content = JSON.stringify({ devices, appVersion, madeAt: new Date().toISOString() });
  const bytes = new TextEncoder().encode(content).length;
  return new Blob([sectionLine({ kind: 'manifest', bytes }), content, sectionEnd]);
}

function entrySection({ device, seq, hash, text, byteLength }: EntryRow): BlobPart[] {
  return [sectionLine({ kind: 'entry', device, seq, hash, bytes: byteLength }), text, sectionEnd];
}

async function photoSection(db: PhoneDatabase, photo: PhotoRow): Promise<BlobPart[]> {
  const { device, sha256, type } = photo;
  const content = await originalBytes(db, sha256, photo.bytes);
  if (content === null) return [];
  const header = sectionLine({ kind: 'photo', device, sha256, type, bytes: content.byteLength });
  // As a Blob of its own the browser may move it out of memory before the next one is read.
  return [new Blob([header, content, sectionEnd])];
}
