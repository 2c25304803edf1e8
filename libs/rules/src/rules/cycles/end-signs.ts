import type { AirCycle } from '@rimeward/field-log';
import { airSeconds, named } from '../../facts/facts';
import { commonPractice, type Rule } from '../../finding/rule';
import { hotParts } from '../sources';

const isEmpty = (cycle: AirCycle): boolean => cycle.endSign === 'mist' || cycle.endSign === 'dry';

/** No cycle of the zone got as far as mist: water is left in it. */
export const neverDry: Rule<'never-dry'> = {
  id: 'never-dry',
  severity: 'fault',
  basis: commonPractice,
  find({ zones, atTheEnd }, report) {
    if (!atTheEnd) return;
    for (const zone of zones) {
      if (zone.state?.skipped || zone.cycles.some(isEmpty)) continue;
      const last = zone.cycles.findLast((cycle) => cycle.endSign !== null);
      if (!last?.endSign) continue;
      report(
        zone.cycles.map((cycle) => cycle.started.entryId),
        { ...named(zone), sign: last.endSign },
      );
    }
  },
};

/** Nobody wrote down what left the heads, in any cycle of the zone. */
export const endSignMissing: Rule<'end-sign-missing'> = {
  id: 'end-sign-missing',
  severity: 'gap',
  basis: commonPractice,
  find({ zones, atTheEnd }, report) {
    if (!atTheEnd) return;
    for (const zone of zones) {
      if (zone.cycles.length === 0 || zone.state?.skipped) continue;
      if (zone.cycles.some((cycle) => cycle.endSign !== null)) continue;
      report(
        zone.cycles.map((cycle) => cycle.started.entryId),
        named(zone),
      );
    }
  },
};

/** Air went on in a zone that was dry already: nothing cools the heads any more. */
export const airAfterDry: Rule<'air-after-dry'> = {
  id: 'air-after-dry',
  severity: 'fault',
  basis: hotParts,
  find({ zones }, report) {
    for (const zone of zones) {
      const dry = zone.cycles.findIndex((cycle) => cycle.endSign === 'dry');
      if (dry < 0 || dry === zone.cycles.length - 1) continue;
      const later = zone.cycles.slice(dry + 1);
      const entryIds = [zone.cycles[dry], ...later].map((cycle) => cycle?.started.entryId);
      report(entryIds, { ...named(zone), seconds: airSeconds(later) });
    }
  },
};
