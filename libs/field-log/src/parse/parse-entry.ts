import { envelopeSchema, type Envelope } from '../entry/envelope';
import type { LogEntry } from '../entry/log-entry';
import { entryTypes, type EntryType } from '../entry-types/registry';
import { upcast } from './upcast';

export type ParseFault = 'unreadable' | 'unknown-type' | 'newer-version' | 'invalid-body';

export type ParsedEntry =
  | { ok: true; entry: LogEntry }
  /** `envelope` is null only when the text itself cannot be read. Nothing is thrown away: the caller holds it for a person. */
  | { ok: false; fault: ParseFault; envelope: Envelope | null; issues: string[] };

/** Reads the exact text of an entry. Dates in 1970 or 2099 are read like any other: a doubtful clock is a finding, not a refusal. */
export function parseEntry(text: string): ParsedEntry {
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch (error) {
    return { ok: false, fault: 'unreadable', envelope: null, issues: [String(error)] };
  }
  return parseEntryValue(value);
}

/** The same for a value that has been read from JSON already. */
export function parseEntryValue(value: unknown): ParsedEntry {
  const envelope = envelopeSchema.safeParse(value);
  if (!envelope.success) {
    return { ok: false, fault: 'unreadable', envelope: null, issues: issuesOf(envelope.error.issues) };
  }
  const { type, typeVersion } = envelope.data;
  if (!Object.hasOwn(entryTypes, type)) {
    return { ok: false, fault: 'unknown-type', envelope: envelope.data, issues: [type] };
  }
  const known = entryTypes[type as EntryType];
  if (typeVersion > known.version) {
    return { ok: false, fault: 'newer-version', envelope: envelope.data, issues: [`${type} ${typeVersion}`] };
  }
  const body = known.body.safeParse(upcast(type as EntryType, typeVersion, envelope.data.body));
  if (!body.success) {
    return { ok: false, fault: 'invalid-body', envelope: envelope.data, issues: issuesOf(body.error.issues) };
  }
  // The body has just been checked against the schema of this very type.
  return { ok: true, entry: { ...envelope.data, typeVersion: known.version, body: body.data } as LogEntry };
}

function issuesOf(issues: readonly { path: PropertyKey[]; message: string }[]): string[] {
  return issues.map((issue) => `${issue.path.map(String).join('.')}: ${issue.message}`);
}
