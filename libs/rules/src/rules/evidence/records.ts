import { ownRecord, type Rule } from '../../finding/rule';

/** A part was taken out and nobody can say where it lies: spring cannot put it back. */
export const partKeptNowhere: Rule<'part-kept-nowhere'> = {
  id: 'part-kept-nowhere',
  severity: 'fault',
  basis: ownRecord,
  find({ state }, report) {
    for (const { kind, protection } of Object.values(state.parts)) {
      if (protection?.how !== 'removed-blank' && protection?.how !== 'removed-spool') continue;
      if (protection.keptWhere === null || protection.keptWhere === 'nowhere') {
        report([protection.entryId], { part: kind });
      }
    }
  },
};

/** A correction does not fit the entry that it names, so it changed nothing; a person has to read it. */
export const correctionIgnored: Rule<'correction-ignored'> = {
  id: 'correction-ignored',
  severity: 'gap',
  basis: ownRecord,
  find({ standing }, report) {
    for (const { entry, ignoredCorrections } of standing) {
      if (ignoredCorrections.length > 0) report([entry.id, ...ignoredCorrections], {});
    }
  },
};
