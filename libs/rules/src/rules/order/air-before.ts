import type { EntryType } from '@rimeward/field-log';
import { named, type VisitFacts, type ZoneFacts } from '../../facts/facts';
import { commonPractice, type Rule } from '../../finding/rule';

/** Where the first air went although an entry of this type had to come before it. */
function airBefore(
  facts: VisitFacts,
  type: EntryType,
): { how: 'late' | 'never'; zone: ZoneFacts; entryIds: string[] } | null {
  const { firstAir } = facts;
  if (firstAir?.entry.type !== 'air-started') return null;
  const first = facts.first(type);
  if (first && !facts.surelyBefore(firstAir, first)) return null;
  const zone = facts.zoneOf(firstAir.entry.body.zoneId);
  return first
    ? { how: 'late', zone, entryIds: [firstAir.entry.id, first.entry.id] }
    : { how: 'never', zone, entryIds: [firstAir.entry.id] };
}

/** Air against a supply that is still open: water and air can be driven back towards the drinking water. */
export const airBeforeWaterOff: Rule<'air-before-water-off'> = {
  id: 'air-before-water-off',
  severity: 'danger',
  basis: commonPractice,
  find(facts, report) {
    const found = airBefore(facts, 'water-off');
    if (found) report(found.entryIds, { how: found.how, ...named(found.zone) });
  },
};

/** Air on top of the pressure that still stood in the pipe. */
export const airBeforeRelief: Rule<'air-before-relief'> = {
  id: 'air-before-relief',
  severity: 'fault',
  basis: commonPractice,
  find(facts, report) {
    const found = airBefore(facts, 'pressure-relieved');
    if (found) report(found.entryIds, { how: found.how, ...named(found.zone) });
  },
};
