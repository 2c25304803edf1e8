import { commonPractice, ownRecord, type Rule } from '../../finding/rule';
import { directedAir, safetyChains } from '../sources';

const protectPeople = new Set(['connection-downstream', 'couplings-pinned', 'cautions-read', 'people-clear']);

/** Something that holds air back was passed by choice; the reason is for the supervisor to judge. */
export const interlockPassed: Rule<'interlock-passed'> = {
  id: 'interlock-passed',
  severity: 'fault',
  basis: ownRecord,
  find({ state }, report) {
    for (const { interlock, reason, entryId } of state.interlocksPassed) {
      report([entryId], { interlock, reason }, protectPeople.has(interlock) ? 'danger' : 'fault');
    }
  },
};

/** Air went on before anybody had read the caution card on this visit. */
export const cautionsNotRead: Rule<'cautions-not-read'> = {
  id: 'cautions-not-read',
  severity: 'fault',
  basis: commonPractice,
  find({ first, firstAir, surelyBefore }, report) {
    if (!firstAir) return;
    const read = first('cautions-read');
    if (!read || surelyBefore(firstAir, read)) {
      report([firstAir.entry.id, read?.entry.id], {});
    }
  },
};

/** Air went on while nobody had said that people stood clear with eyes and ears protected. */
export const peopleNotClear: Rule<'people-not-clear'> = {
  id: 'people-not-clear',
  severity: 'danger',
  basis: directedAir,
  find({ standing, firstAir, surelyBefore }, report) {
    if (!firstAir) return;
    const clear = standing.find(
      ({ entry }) => entry.type === 'people-clear' && entry.body.areaClear && entry.body.eyesAndEars,
    );
    if (!clear) report([firstAir.entry.id], { how: 'never' });
    else if (surelyBefore(firstAir, clear)) {
      report([firstAir.entry.id, clear.entry.id], { how: 'late' });
    }
  },
};

/** Air ran through a hose whose couplings were said not to be pinned. */
export const couplingsNotPinned: Rule<'couplings-not-pinned'> = {
  id: 'couplings-not-pinned',
  severity: 'danger',
  basis: safetyChains,
  find({ state, firstAir }, report) {
    if (firstAir && state.connection && !state.connection.couplingsPinned) {
      report([state.connection.entryId, firstAir.entry.id], {});
    }
  },
};
