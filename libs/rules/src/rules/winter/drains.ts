import { commonPractice, type Rule } from '../../finding/rule';

/** A drain stays open over winter: in spring the water runs out of it. */
export const drainLeftOpen: Rule<'drain-left-open'> = {
  id: 'drain-left-open',
  severity: 'fault',
  basis: commonPractice,
  find({ state, system }, report) {
    for (const said of Object.values(state.drains)) {
      const known = system.drains.find((drain) => drain.id === said.drainId);
      if (said.position !== 'open' || known?.kind === 'automatic') continue;
      report([said.entryId], { drain: known?.kind ?? 'manual', place: known?.place ?? '' });
    }
  },
};

/** A drain on record was not spoken of. */
export const drainNotRecorded: Rule<'drain-not-recorded'> = {
  id: 'drain-not-recorded',
  severity: 'gap',
  basis: commonPractice,
  find({ state, system, atTheEnd }, report) {
    if (!atTheEnd) return;
    for (const drain of system.drains) {
      if (!state.drains[drain.id]) report([], { drain: drain.kind, place: drain.place });
    }
  },
};

/** A drain did not run dry: it is blocked, or the supply leaks past its shutoff. */
export const drainNotDry: Rule<'drain-not-dry'> = {
  id: 'drain-not-dry',
  severity: 'fault',
  basis: commonPractice,
  find({ state, system }, report) {
    for (const said of Object.values(state.drains)) {
      if (said.ranDry) continue;
      const known = system.drains.find((drain) => drain.id === said.drainId);
      report([said.entryId], { drain: known?.kind ?? 'manual', place: known?.place ?? '' });
    }
  },
};
