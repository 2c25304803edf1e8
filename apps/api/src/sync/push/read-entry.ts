import { createHash } from 'node:crypto';
import { noPrevious, readHeader, type EntryHeader } from '@rimeward/delivery';
import { parseEntryValue, type EntryType, type ParseFault, type PhotoReference } from '@rimeward/field-log';

/** One pushed entry, hashed and looked at, before any transaction is open. */
export interface ReadEntry {
  bytes: Buffer;
  /** Null when the text does not even say whose it is. */
  header: EntryHeader | null;
  /** Over the previous hash that the entry itself names; over zeros when it names none. */
  prev: string;
  hash: string;
  /** Why a person has to look at it, as far as the text alone tells. */
  fault: ParseFault | null;
  /** Copies for queries; null where they cannot be trusted to be what they say. */
  type: EntryType | null;
  visit: string | null;
  actor: string | null;
  company: string | null;
  photos: PhotoReference[];
}

/** SHA-256 over the previous hash's 32 bytes and the exact bytes, as `entryHash` of the delivery library. */
export function chainHash(prevHex: string, bytes: Buffer): string {
  return createHash('sha256').update(prevHex, 'hex').update(bytes).digest('hex');
}

/** Reads, checks and hashes the exact text of one entry; never throws whatever the text is. */
export function readEntry(text: string): ReadEntry {
  const bytes = Buffer.from(text, 'utf8');
  const header = readHeader(text);
  const prev = header?.prev ?? noPrevious;
  return { bytes, header, prev, hash: chainHash(prev, bytes), ...lookInto(text, header) };
}

type Inside = Omit<ReadEntry, 'bytes' | 'header' | 'prev' | 'hash'>;

function lookInto(text: string, header: EntryHeader | null): Inside {
  const nothing = { type: null, visit: null, actor: null, company: null, photos: [] };
  if (header === null) return { ...nothing, fault: 'unreadable' };
  const value = JSON.parse(text) as Record<string, unknown>;
  const parsed = parseEntryValue(value);
  if (parsed.ok) {
    const { type, visit, actor, company, photos } = parsed.entry;
    return { type, visit, actor, company, photos, fault: null };
  }
  const { fault, envelope } = parsed;
  if (envelope !== null) {
    const { visit, actor, company, photos } = envelope;
    return { type: null, visit, actor, company, photos, fault };
  }
  const newer = typeof value.v === 'number' && value.v > 1;
  return { ...nothing, ...claims(value), fault: newer ? 'newer-version' : 'invalid-body' };
}

const uuid = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/;

/** What an envelope that we cannot read as a whole says about its place, so that a person finds it there. */
function claims(value: Record<string, unknown>): Pick<Inside, 'visit' | 'actor' | 'company'> {
  const id = (claim: unknown): string | null =>
    typeof claim === 'string' && uuid.test(claim) ? claim : null;
  return { visit: id(value.visit), actor: id(value.actor), company: id(value.company) };
}
