import type { FoldedEntry } from '../visit/visit-state';
import type { LogEntryOf } from '../entry/log-entry';
import type { TimedEntry } from './order';

/**
 * Puts the corrections beside the entries they name. The latest standing correction of an entry rules; a correction that is
 * itself withdrawn does not count. `bodyFits` says whether a replacement body is one of that type; a body that does not fit
 * leaves the entry as it was.
 */
export function withCorrections(
  timed: readonly TimedEntry[],
  bodyFits: (type: string, body: Record<string, unknown>) => boolean,
): FoldedEntry[] {
  const corrections = new Map<string, LogEntryOf<'corrected'>[]>();
  for (const { entry } of timed) {
    if (entry.type !== 'corrected') continue;
    corrections.set(entry.body.of, [...(corrections.get(entry.body.of) ?? []), entry]);
  }
  const standingOf = (id: string, seen: ReadonlySet<string>): LogEntryOf<'corrected'>[] =>
    (corrections.get(id) ?? []).filter((correction) => {
      if (seen.has(correction.id)) return false;
      const own = standingOf(correction.id, new Set([...seen, correction.id]));
      return own.at(-1)?.body.body !== null;
    });

  return timed.map(({ entry, atMs }): FoldedEntry => {
    const all = corrections.get(entry.id) ?? [];
    if (all.length === 0) return { entry, atMs, corrections: [], standing: 'standing' };
    const ruling = standingOf(entry.id, new Set([entry.id])).at(-1);
    if (!ruling) return { entry, atMs, corrections: all, standing: 'standing' };
    const body = ruling.body.body;
    if (body === null) return { entry, atMs, corrections: all, standing: 'withdrawn' };
    if (!bodyFits(entry.type, body)) return { entry, atMs, corrections: all, standing: 'standing' };
    // The body has just been checked against the entry's own type.
    const corrected = { ...entry, body } as typeof entry;
    return { entry: corrected, atMs, corrections: all, standing: 'corrected' };
  });
}
