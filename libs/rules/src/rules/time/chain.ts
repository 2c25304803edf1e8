import { ownRecord, type Rule } from '../../finding/rule';

/** Numbers of a phone's log are missing in the office: entries of this visit may be among them. */
export const deviceGap: Rule<'device-gap'> = {
  id: 'device-gap',
  severity: 'gap',
  basis: ownRecord,
  find({ context, state }, report) {
    for (const { device, fromSeq, toSeq } of context.deviceGaps ?? []) {
      if (!state.devices.includes(device)) continue;
      const after = state.entries.find(({ entry }) => entry.device === device && entry.seq > toSeq);
      report([after?.entry.id], { device, missing: toSeq - fromSeq + 1 });
    }
  },
};

/** An entry does not continue the chain of its phone: something before it was changed or taken away. */
export const chainBroken: Rule<'chain-broken'> = {
  id: 'chain-broken',
  severity: 'fault',
  basis: ownRecord,
  find({ context }, report) {
    for (const { device, seq, entryId } of context.brokenChains ?? []) report([entryId], { device, seq });
  },
};
