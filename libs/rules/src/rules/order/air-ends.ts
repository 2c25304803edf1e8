import { named } from '../../facts/facts';
import { commonPractice, ownRecord, type Rule } from '../../finding/rule';

/** The crew left, or shut the compressor down, and a cycle has no end: its air time is not known. */
export const airNeverStopped: Rule<'air-never-stopped'> = {
  id: 'air-never-stopped',
  severity: 'fault',
  basis: commonPractice,
  find({ state, zoneOf }, report) {
    const end = state.left ?? state.closeDown['compressor-off'];
    if (!end) return;
    for (const cycle of state.runningCycles) {
      report([cycle.started.entryId, end.entryId], named(zoneOf(cycle.zoneId)));
    }
  },
};

/** Air was said to stop in a cycle that nobody started: a start is missing or was withdrawn. */
export const stopWithoutStart: Rule<'stop-without-start'> = {
  id: 'stop-without-start',
  severity: 'gap',
  basis: ownRecord,
  find({ standing, cycles }, report) {
    const known = new Set(cycles.map((cycle) => cycle.cycleId));
    for (const { entry } of standing) {
      if (entry.type === 'air-stopped' && !known.has(entry.body.cycleId)) report([entry.id], {});
    }
  },
};

/** The hose came off before its pressure was let out: a coupling that lets go whips. */
export const hoseOffUnderPressure: Rule<'hose-off-under-pressure'> = {
  id: 'hose-off-under-pressure',
  severity: 'danger',
  basis: commonPractice,
  find({ standing, firstAir, placeOf }, report) {
    if (!firstAir) return;
    const firstOf = (step: string) =>
      standing.find(({ entry }) => entry.type === 'air-closed-down' && entry.body.step === step)?.entry;
    const off = firstOf('hose-off');
    const bled = firstOf('hose-bled');
    if (off && bled && placeOf(off.id) < placeOf(bled.id)) report([off.id, bled.id], {});
  },
};

/** Compressor off, hose bled, hose off: not all three are written down. */
export const closeDownIncomplete: Rule<'close-down-incomplete'> = {
  id: 'close-down-incomplete',
  severity: 'gap',
  basis: commonPractice,
  find({ state, firstAir, atTheEnd }, report) {
    if (!firstAir || !atTheEnd) return;
    const steps = Object.keys(state.closeDown).length;
    if (steps < 3)
      report(
        Object.values(state.closeDown).map((said) => said.entryId),
        { steps },
      );
  },
};

/** The visit was broken off: water is still in the ground, and somebody has to come back. */
export const visitCutShort: Rule<'visit-cut-short'> = {
  id: 'visit-cut-short',
  severity: 'fault',
  basis: ownRecord,
  find({ state, zones }, report) {
    if (state.left?.outcome !== 'cut-short') return;
    const zonesLeft = zones.filter(
      (zone) => zone.zone && !zone.cycles.some((one) => one.endSign === 'mist' || one.endSign === 'dry'),
    ).length;
    report([state.left.entryId], { why: state.left.why ?? 'other', zonesLeft });
  },
};
