import { airSeconds, named } from '../../facts/facts';
import { commonPractice, type Rule } from '../../finding/rule';

/** The first air of the zones came in another order than proposed. One finding, for the first zone out of its place. */
export const orderAgainstPlan: Rule<'order-against-plan'> = {
  id: 'order-against-plan',
  severity: 'note',
  basis: commonPractice,
  find({ plan, cycles, zoneOf }, report) {
    if (!plan) return;
    const first = new Map<string, string>();
    for (const cycle of cycles) {
      if (!first.has(cycle.zoneId)) first.set(cycle.zoneId, cycle.started.entryId);
    }
    // Zones without air are told of elsewhere; only the order of the others is compared.
    const planned = plan.order.filter((zoneId) => first.has(zoneId));
    const done = [...first.keys()].filter((zoneId) => plan.order.includes(zoneId));
    const place = done.findIndex((zoneId, index) => zoneId !== planned[index]);
    const zoneId = done[place];
    if (zoneId === undefined) return;
    const plannedPlace = planned.indexOf(zoneId) + 1;
    report([first.get(zoneId)], { ...named(zoneOf(zoneId)), plannedPlace, place: place + 1 });
  },
};

/** A zone got far less, or far more, air than the water in its pipe calls for. */
export const airAgainstWater: Rule<'air-against-water'> = {
  id: 'air-against-water',
  severity: 'note',
  basis: commonPractice,
  find({ plan, zones, thresholds, atTheEnd }, report) {
    if (!plan || !atTheEnd) return;
    for (const zone of zones) {
      const expected = plan.airSecondsByZone[zone.id];
      const given = airSeconds(zone.cycles);
      if (!expected || given === 0 || zone.state?.skipped) continue;
      const share = given / expected;
      const how =
        share < thresholds.tooLittleAir ? 'too-little' : share > thresholds.tooMuchAir ? 'too-much' : null;
      if (!how) continue;
      const entryIds = zone.cycles.map((cycle) => cycle.started.entryId);
      report(entryIds, { ...named(zone), airSeconds: given, expectedSeconds: Math.round(expected), how });
    }
  },
};
