import { commonPractice, type Rule } from '../../finding/rule';

/** The air connection is open, or nobody knows: soil and animals get in, and water runs out in spring. */
export const plugNotRefitted: Rule<'plug-not-refitted'> = {
  id: 'plug-not-refitted',
  severity: 'fault',
  basis: commonPractice,
  find({ state, firstAir, atTheEnd }, report) {
    if (state.plug) {
      if (!state.plug.plugged) report([state.plug.entryId], { how: 'said' });
    } else if (firstAir && atTheEnd) {
      report([state.connection?.entryId], { how: 'not-recorded' }, 'gap');
    }
  },
};

/** The pump holds water, or nobody knows. A pump is drained by its plug and never blown through. */
export const pumpNotDrained: Rule<'pump-not-drained'> = {
  id: 'pump-not-drained',
  severity: 'fault',
  basis: commonPractice,
  find({ state, system, atTheEnd }, report) {
    if (state.pump) {
      if (!state.pump.drained) report([state.pump.entryId], { how: 'said' });
    } else if (system.pump && atTheEnd) {
      report([], { how: 'not-recorded' }, 'gap');
    }
  },
};

/** The controller will open valves in winter, or nobody knows. */
export const controllerStillOn: Rule<'controller-still-on'> = {
  id: 'controller-still-on',
  severity: 'fault',
  basis: commonPractice,
  find({ state, atTheEnd }, report) {
    if (state.controller) {
      if (state.controller.mode === 'still-on') report([state.controller.entryId], { how: 'said' });
    } else if (atTheEnd) {
      report([], { how: 'not-recorded' }, 'gap');
    }
  },
};
