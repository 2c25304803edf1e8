import { airSeconds, named } from '../../facts/facts';
import { commonPractice, type Rule } from '../../finding/rule';
import { hotParts } from '../sources';

/** A cycle ran past what the heads of its zone stand. */
export const cycleTooLong: Rule<'cycle-too-long'> = {
  id: 'cycle-too-long',
  severity: 'fault',
  basis: hotParts,
  find({ zones, plan, thresholds }, report) {
    for (const zone of zones) {
      const kind = zone.zone?.headKind ?? 'unknown';
      const capSeconds = plan?.capSecondsByZone?.[zone.id] ?? thresholds.cycleCapSeconds[kind];
      for (const cycle of zone.cycles) {
        const seconds = airSeconds([cycle]);
        if (seconds <= capSeconds + thresholds.cycleGraceSeconds || seconds > thresholds.unattendedSeconds)
          continue;
        report([cycle.started.entryId, cycle.stopped?.entryId], { ...named(zone), seconds, capSeconds });
      }
    }
  },
};

/** Air stayed on so long that nobody can have stood by. */
export const airUnattended: Rule<'air-unattended'> = {
  id: 'air-unattended',
  severity: 'danger',
  basis: commonPractice,
  find({ zones, thresholds }, report) {
    for (const zone of zones) {
      for (const cycle of zone.cycles) {
        const seconds = airSeconds([cycle]);
        if (seconds <= thresholds.unattendedSeconds) continue;
        report([cycle.started.entryId, cycle.stopped?.entryId], { ...named(zone), seconds });
      }
    }
  },
};

/** The zone got its next air before its parts had cooled and its water had run together. */
export const restTooShort: Rule<'rest-too-short'> = {
  id: 'rest-too-short',
  severity: 'note',
  basis: commonPractice,
  find({ zones, thresholds }, report) {
    for (const zone of zones) {
      for (const [index, cycle] of zone.cycles.entries()) {
        const before = zone.cycles[index - 1]?.stopped;
        if (!before) continue;
        const restMs = cycle.started.atMs - before.atMs;
        if (restMs < 0 || restMs >= thresholds.restSeconds * 1_000) continue;
        report([before.entryId, cycle.started.entryId], {
          ...named(zone),
          seconds: Math.round(restMs / 1_000),
          wantedSeconds: thresholds.restSeconds,
        });
      }
    }
  },
};
