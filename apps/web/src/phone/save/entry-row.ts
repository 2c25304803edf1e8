import { sealEntry } from '@rimeward/delivery';
import type { LogEntry } from '@rimeward/field-log';
import type { ClockKnowledge } from '../clock/known-time';
import { codec } from '../codec';
import type { ChainMark, EntryRow } from '../database/schema';
import { ownerOf } from '../device/enrolment';
import { entryDraft, type NewEntry } from './entry-draft';
import { SaveRefused } from './save-refused';

/** Longest text that the office takes as one entry, UTF-16 units. */
const longestText = 64 * 1024;

/** The row that follows `head` in a device's chain. Synchronous: it can be made inside a transaction. */
export function entryRow(
  entry: NewEntry,
  device: string,
  head: ChainMark,
  clock: ClockKnowledge,
  wallMs: number,
): EntryRow {
  const sealed = sealEntry(entryDraft(entry, device, clock, wallMs), head, codec);
  if (sealed.text.length > longestText) throw new SaveRefused('too-large');
  const parsed = JSON.parse(sealed.text) as LogEntry;
  return {
    ...sealed,
    device,
    id: parsed.id,
    owner: ownerOf(entry.company, entry.actor),
    visit: entry.visit,
    bytesThrough: head.bytesThrough + sealed.byteLength,
    entry: parsed,
    savedMs: wallMs,
  };
}
