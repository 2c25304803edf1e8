import { ownRecord, type Rule } from '../../finding/rule';

/** Air was given by somebody whom the company has not signed off for blow-out work. */
export const notSignedOff: Rule<'not-signed-off'> = {
  id: 'not-signed-off',
  severity: 'fault',
  basis: ownRecord,
  find({ cycles, context }, report) {
    const signedOff = context.signedOff;
    if (!signedOff) return;
    const told = new Set<string>();
    for (const { started } of cycles) {
      if (signedOff[started.actor] !== false || told.has(started.actor)) continue;
      told.add(started.actor);
      report([started.entryId], { person: started.actor });
    }
  },
};

/** One person alone gave air, where the company forbids it. */
export const workingAlone: Rule<'working-alone'> = {
  id: 'working-alone',
  severity: 'fault',
  basis: ownRecord,
  find({ settings, state, firstAir }, report) {
    if (!settings.forbidsWorkingAlone || !firstAir) return;
    const there = new Set([...(state.arrived?.crew ?? []), ...state.actors]);
    if (there.size > 1) return;
    report([state.arrived?.entryId, firstAir.entry.id], { person: firstAir.entry.actor });
  },
};
