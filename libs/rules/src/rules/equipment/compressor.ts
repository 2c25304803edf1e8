import { airSeconds, named } from '../../facts/facts';
import { commonPractice, type Rule } from '../../finding/rule';

/** Air was given and nobody wrote down by which compressor. */
export const compressorNotRecorded: Rule<'compressor-not-recorded'> = {
  id: 'compressor-not-recorded',
  severity: 'gap',
  basis: commonPractice,
  find({ state, firstAir }, report) {
    if (firstAir && !state.arrived?.compressorId) report([state.arrived?.entryId, firstAir.entry.id], {});
  },
};

/** The compressor cannot deliver what the system asks for: air rides over the water instead of pushing it. */
export const compressorTooSmall: Rule<'compressor-too-small'> = {
  id: 'compressor-too-small',
  severity: 'fault',
  basis: commonPractice,
  find({ plan, firstAir, state }, report) {
    if (!firstAir || plan?.compressor?.verdict !== 'too-small') return;
    report([state.arrived?.entryId, firstAir.entry.id], { compressor: plan.compressor.name });
  },
};

/** Many bursts of a few seconds: a tank filled and let go, which leaves water and shocks the pipe. */
export const tankBurstPattern: Rule<'tank-burst-pattern'> = {
  id: 'tank-burst-pattern',
  severity: 'fault',
  basis: commonPractice,
  find({ zones, thresholds }, report) {
    for (const zone of zones) {
      const bursts = zone.cycles.filter(
        (cycle) => cycle.durationMs !== null && cycle.durationMs <= thresholds.burstSeconds * 1_000,
      );
      if (bursts.length < thresholds.burstCycles || bursts.length * 2 < zone.cycles.length) continue;
      const entryIds = bursts.map((cycle) => cycle.started.entryId);
      const seconds = Math.round(airSeconds(bursts) / bursts.length);
      report(entryIds, { ...named(zone), cycles: bursts.length, seconds });
    }
  },
};
