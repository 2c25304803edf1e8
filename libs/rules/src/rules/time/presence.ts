import type { EntryType } from '@rimeward/field-log';
import { airSeconds, type VisitFacts } from '../../facts/facts';
import { ownRecord, type Rule } from '../../finding/rule';

/** What can be written from anywhere, later: it does not say that somebody stood on the site. */
const fromAnywhere: ReadonlySet<EntryType> = new Set([
  'question-answered',
  'corrected',
  'note-written',
  'photographs-added',
]);

interface Stay {
  fromMs: number;
  toMs: number;
  firstId: string;
  lastId: string;
}

/** From the first to the last thing that each person did on the site. */
function staysOf({ standing }: VisitFacts): Map<string, Stay> {
  const stays = new Map<string, Stay>();
  for (const { entry, atMs } of standing) {
    if (fromAnywhere.has(entry.type)) continue;
    const stay = stays.get(entry.actor);
    if (!stay) {
      stays.set(entry.actor, { fromMs: atMs, toMs: atMs, firstId: entry.id, lastId: entry.id });
    } else if (atMs >= stay.toMs) {
      stay.toMs = atMs;
      stay.lastId = entry.id;
    }
  }
  return stays;
}

/** One person worked on two sites at the same time. */
export const twoPlacesAtOnce: Rule<'two-places-at-once'> = {
  id: 'two-places-at-once',
  severity: 'fault',
  basis: ownRecord,
  find(facts, report) {
    const others = facts.context.otherStays;
    if (!others || others.length === 0) return;
    const stays = staysOf(facts);
    for (const other of others) {
      const stay = stays.get(other.actor);
      if (!stay) continue;
      const sharedMs = Math.min(stay.toMs, other.toMs) - Math.max(stay.fromMs, other.fromMs);
      if (sharedMs <= facts.thresholds.overlapMinutes * 60_000) continue;
      report([...new Set([stay.firstId, stay.lastId])], {
        person: other.actor,
        elsewhere: other.siteName,
        minutes: Math.round(sharedMs / 60_000),
      });
    }
  },
};

/** More air was logged than there was time between arriving and leaving. */
export const visitShorterThanAir: Rule<'visit-shorter-than-air'> = {
  id: 'visit-shorter-than-air',
  severity: 'fault',
  basis: ownRecord,
  find({ state, cycles }, report) {
    if (!state.arrived || !state.left) return;
    const visitSeconds = Math.round((state.left.atMs - state.arrived.atMs) / 1_000);
    const air = airSeconds(cycles);
    // A minute of grace: each time was rounded by a thumb.
    if (air > Math.max(0, visitSeconds) + 60) {
      report([state.arrived.entryId, state.left.entryId], { visitSeconds, airSeconds: air });
    }
  },
};
