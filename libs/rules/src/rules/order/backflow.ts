import { commonPractice, type Rule } from '../../finding/rule';
import { greeley } from '../sources';

/** Air entered where it passes the backflow assembly: its parts break, and it leads to the drinking water. */
export const airThroughBackflow: Rule<'air-through-backflow'> = {
  id: 'air-through-backflow',
  severity: 'danger',
  basis: greeley,
  find({ standing, firstAir, cycles, placeOf }, report) {
    if (!firstAir) return;
    for (const [index, { entry }] of standing.entries()) {
      if (entry.type !== 'air-connected') continue;
      if (entry.body.downstreamOfBackflow && entry.body.place !== 'test-cock') continue;
      const next = standing.slice(index + 1).find((later) => later.entry.type === 'air-connected');
      const until = next ? placeOf(next.entry.id) : Number.POSITIVE_INFINITY;
      const air = cycles.find(({ started }) => {
        const place = placeOf(started.entryId);
        return place > index && place < until;
      });
      if (air) report([entry.id, air.started.entryId], { place: entry.body.place });
    }
  },
};

/** Nobody wrote down where the hose joined the system. */
export const connectionNotRecorded: Rule<'connection-not-recorded'> = {
  id: 'connection-not-recorded',
  severity: 'gap',
  basis: commonPractice,
  find({ state, firstAir }, report) {
    if (firstAir && !state.connection) report([firstAir.entry.id], {});
  },
};

/** A shutoff of the assembly was open, or nobody knows, when the first air went on. */
export const airWithBackflowOpen: Rule<'air-with-backflow-open'> = {
  id: 'air-with-backflow-open',
  severity: 'fault',
  basis: greeley,
  find({ system, standing, firstAir, placeOf }, report) {
    if (!firstAir) return;
    const airAt = placeOf(firstAir.entry.id);
    for (const valve of system.backflow.valves) {
      if (valve.role !== 'shutoff') continue;
      const name = `${valve.role}-${valve.number}`;
      const before = standing
        .slice(0, airAt)
        .findLast(
          ({ entry }) =>
            entry.type === 'valve-set' &&
            entry.body.valveId === valve.id &&
            entry.body.stage === 'before-air',
        );
      if (before?.entry.type !== 'valve-set') {
        report([firstAir.entry.id], { valve: name, how: 'not-recorded' }, 'gap');
      } else if (before.entry.body.position !== 'closed') {
        report([before.entry.id, firstAir.entry.id], { valve: name, how: 'open' });
      }
    }
  },
};
