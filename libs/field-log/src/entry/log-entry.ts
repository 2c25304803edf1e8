import type { EntryBody, EntryType } from '../entry-types/registry';
import type { Envelope } from './envelope';

/** An entry whose body has been checked against its type: what the fold, the rules and the screens read. */
export type LogEntry = {
  [T in EntryType]: Omit<Envelope, 'type' | 'body'> & { type: T; body: EntryBody<T> };
}[EntryType];

export type LogEntryOf<T extends EntryType> = Extract<LogEntry, { type: T }>;
