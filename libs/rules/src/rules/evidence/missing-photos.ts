import { ownRecord, type Rule } from '../../finding/rule';

/** A part was removed or bypassed and no photograph shows it. */
export const partWithoutPhoto: Rule<'part-without-photo'> = {
  id: 'part-without-photo',
  severity: 'gap',
  basis: ownRecord,
  find({ state }, report) {
    for (const part of Object.values(state.parts)) {
      if (!part.protection || part.protection.how === 'left' || part.photos.length > 0) continue;
      report([part.protection.entryId], { part: part.kind });
    }
  },
};

/** The winter position of the assembly's valves is written down and no photograph shows any of them. */
export const backflowWithoutPhoto: Rule<'backflow-without-photo'> = {
  id: 'backflow-without-photo',
  severity: 'gap',
  basis: ownRecord,
  find({ state, atTheEnd }, report) {
    if (!atTheEnd) return;
    const set = Object.values(state.valves).filter((valve) => valve.winter);
    if (set.length === 0 || set.some((valve) => valve.photos.length > 0)) return;
    if (state.photos.some(({ photo }) => photo.role === 'backflow-valve')) return;
    report(
      set.map((valve) => valve.winter?.entryId),
      {},
    );
  },
};

/** Damage that was there before the work began is only told, not shown: it can be blamed on the crew. */
export const damageWithoutPhoto: Rule<'damage-without-photo'> = {
  id: 'damage-without-photo',
  severity: 'gap',
  basis: ownRecord,
  find({ state }, report) {
    for (const damage of state.damageSeen) {
      if (damage.photos.length === 0) report([damage.entryId], { where: damage.where });
    }
  },
};

/** A repair is recommended and nothing shows why. */
export const defectWithoutPhoto: Rule<'defect-without-photo'> = {
  id: 'defect-without-photo',
  severity: 'note',
  basis: ownRecord,
  find({ state }, report) {
    for (const defect of state.defects) {
      if (defect.photos.length === 0) report([defect.entryId], { where: defect.where });
    }
  },
};
