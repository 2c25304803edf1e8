import { named } from '../../facts/facts';
import { commonPractice, type Rule } from '../../finding/rule';

/** Water runs together in low spots between two cycles; one alone leaves it there. */
export const tooFewCycles: Rule<'too-few-cycles'> = {
  id: 'too-few-cycles',
  severity: 'fault',
  basis: commonPractice,
  find({ zones, thresholds, atTheEnd }, report) {
    if (!atTheEnd) return;
    const wanted = thresholds.cyclesPerZone;
    for (const zone of zones) {
      const cycles = zone.cycles.length;
      if (cycles === 0 || cycles >= wanted || zone.state?.skipped) continue;
      const entryIds = zone.cycles.map((cycle) => cycle.started.entryId);
      report(entryIds, { ...named(zone), cycles, wanted });
    }
  },
};

/** A zone on record got no air, and nobody said why. */
export const zoneWithoutAir: Rule<'zone-without-air'> = {
  id: 'zone-without-air',
  severity: 'fault',
  basis: commonPractice,
  find({ zones, usesAir, atTheEnd }, report) {
    if (!usesAir || !atTheEnd) return;
    for (const zone of zones) {
      if (zone.zone && zone.cycles.length === 0 && !zone.state?.skipped) report([], named(zone));
    }
  },
};

/** A zone was skipped by choice: its water is still in the ground. */
export const zoneSkipped: Rule<'zone-skipped'> = {
  id: 'zone-skipped',
  severity: 'fault',
  basis: commonPractice,
  find({ zones }, report) {
    for (const zone of zones) {
      const skipped = zone.state?.skipped;
      if (skipped) report([skipped.entryId], { ...named(zone), reason: skipped.reason });
    }
  },
};
