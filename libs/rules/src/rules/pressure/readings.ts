import { named } from '../../facts/facts';
import { commonPractice, type Rule } from '../../finding/rule';

/** Air was given without a word about the regulator. */
export const regulatorNotRecorded: Rule<'regulator-not-recorded'> = {
  id: 'regulator-not-recorded',
  severity: 'gap',
  basis: commonPractice,
  find({ first, firstAir, surelyBefore }, report) {
    if (!firstAir) return;
    const set = first('regulator-set');
    if (!set || surelyBefore(firstAir, set)) report([firstAir.entry.id], {});
  },
};

/** A zone had air and no gauge was read in any of its cycles: nobody can tell which pressure it saw. */
export const noGaugeReading: Rule<'no-gauge-reading'> = {
  id: 'no-gauge-reading',
  severity: 'gap',
  basis: commonPractice,
  find({ zones }, report) {
    for (const zone of zones) {
      const finished = zone.cycles.filter((cycle) => cycle.stopped);
      if (finished.length === 0 || zone.cycles.some((cycle) => cycle.gaugeReadings.length > 0)) continue;
      report(
        finished.map((cycle) => cycle.started.entryId),
        named(zone),
      );
    }
  },
};
