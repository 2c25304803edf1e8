import type { LogEntryOf } from '../entry/log-entry';
import type { FoldedEntry } from '../visit/visit-state';
import { bodyFits } from './body-shapes';
import type { TimedEntry } from './order';

type Correction = LogEntryOf<'corrected'>;

/** What the corrections of one entry come to. `ignored` names those whose new body is not one of the entry's type. */
interface Ruling {
  standing: FoldedEntry['standing'];
  body: Record<string, unknown> | null;
  ignored: string[];
}

/**
 * Puts the corrections beside the entries they name. The latest standing correction of an entry rules. A correction may
 * itself be corrected or withdrawn; corrections that name each other in a circle count for nothing. A new body that does not
 * fit the entry's type is passed over, so that the last good word stands.
 */
export function withCorrections(timed: readonly TimedEntry[]): FoldedEntry[] {
  const named = new Map<string, Correction[]>();
  for (const { entry } of timed) {
    if (entry.type !== 'corrected') continue;
    const others = named.get(entry.body.of);
    if (others) others.push(entry);
    else named.set(entry.body.of, [entry]);
  }
  if (named.size === 0) return timed.map(untouched);

  const effective = effectiveBodies(timed, named);
  return timed.map((one): FoldedEntry => {
    const corrections = named.get(one.entry.id);
    if (!corrections) return untouched(one);
    const { standing, body, ignored } = rule(one.entry.type, corrections, effective);
    // A new body has been checked against the entry's own type.
    const entry = body === null ? one.entry : ({ ...one.entry, body } as typeof one.entry);
    return { ...one, entry, corrections, ignoredCorrections: ignored, standing };
  });
}

function untouched({ entry, atMs, claimedMs }: TimedEntry): FoldedEntry {
  return { entry, atMs, claimedMs, corrections: [], ignoredCorrections: [], standing: 'standing' };
}

/** The body by which each standing correction counts; corrections without corrections are settled first. */
function effectiveBodies(
  timed: readonly TimedEntry[],
  named: ReadonlyMap<string, readonly Correction[]>,
): Map<string, Correction['body']> {
  const open = new Map<string, number>();
  const byId = new Map<string, Correction>();
  for (const { entry } of timed) {
    if (entry.type !== 'corrected') continue;
    byId.set(entry.id, entry);
    open.set(entry.id, named.get(entry.id)?.length ?? 0);
  }
  const effective = new Map<string, Correction['body']>();
  const ready = [...byId.values()].filter((correction) => open.get(correction.id) === 0);
  for (let next = ready.pop(); next; next = ready.pop()) {
    const { standing, body } = rule('corrected', named.get(next.id) ?? [], effective);
    if (standing !== 'withdrawn') {
      // A correction keeps its target: another one would be another correction.
      effective.set(next.id, { ...next.body, ...body, of: next.body.of });
    }
    const left = (open.get(next.body.of) ?? 0) - 1;
    open.set(next.body.of, left);
    const target = byId.get(next.body.of);
    if (target && left === 0) ready.push(target);
  }
  return effective;
}

function rule(
  type: string,
  corrections: readonly Correction[],
  effective: ReadonlyMap<string, Correction['body']>,
): Ruling {
  const ruling: Ruling = { standing: 'standing', body: null, ignored: [] };
  for (const correction of corrections) {
    const said = effective.get(correction.id);
    if (!said) continue;
    if (said.body === null) {
      ruling.standing = 'withdrawn';
      ruling.body = null;
    } else if (bodyFits(type, said.body)) {
      ruling.standing = 'corrected';
      ruling.body = said.body;
    } else {
      ruling.ignored.push(correction.id);
    }
  }
  return ruling;
}
