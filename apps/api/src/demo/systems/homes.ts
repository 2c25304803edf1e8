import type { BackflowKind, System } from '@rimeward/field-log';
import { idOf, type Chance } from '../chance';
import { backflow, gardenZones, run } from './pieces';

/** Gardens of houses: most of what a crew sees in a week. */

export type Builder = (key: string, chance: Chance, zones: number) => System;

const basement = { kind: 'building', place: 'Basement, front wall' } as const;

function home(kind: BackflowKind, place: string): Builder {
  return (key, chance, zones) => ({
    id: idOf('system', key),
    name: 'Garden',
    removalMethod: 'blow-out',
    pointOfConnection: basement,
    waterShutoff: {
      place: chance.pick([
        'Basement, left of the water heater',
        'Crawl space, by the hatch',
        'Utility closet',
      ]),
      kind: chance.pick(['ball', 'ball', 'gate'] as const),
    },
    backflow: backflow(kind, place, chance.pick([0.75, 1] as const)),
    airConnection: {
      kind: 'blow-out-fitting',
      place: `${place}, behind the assembly`,
      downstreamOfBackflow: true,
    },
    mainLine: [run('main', 'pvc-sdr21', 1, chance.whole(40, 110), { guessed: chance.often(0.4) })],
    sensitiveParts: [],
    controller: { place: 'Garage, by the side door', zoneCount: zones },
    drains: [{ id: idOf('drain', key, 'upstream'), kind: 'upstream', place: 'Under the water shutoff' }],
    pump: null,
    zones: gardenZones(chance, zones, { lateral: 'pvc-sdr21', ids: (n) => idOf('zone', key, n) }),
  });
}

export const homeWithPvb = home('PVB', 'West wall, beside the meter');
export const homeWithDcva = home('DCVA', 'Box in the front lawn');
export const homeWithSvb = home('SVB', 'Garage wall, inside');
export const homeWithAvbs = home('AVB', 'Back wall, one for each valve');

/** The same garden with a drip main behind a regulator and a filter, which air must not reach at speed. */
export const homeWithDrip: Builder = (key, chance, zones) => ({
  ...homeWithPvb(key, chance, zones),
  sensitiveParts: [
    {
      id: idOf('part', key, 'filter'),
      kind: 'filter',
      place: 'Valve box at the back',
      sizeIn: 1,
      hasBypass: false,
    },
    {
      id: idOf('part', key, 'regulator'),
      kind: 'pressure-regulator',
      place: 'Behind the filter',
      sizeIn: 1,
      hasBypass: false,
    },
  ],
});

/** A house on a slope: the highest heads and the lowest ones are far apart. */
export const hillsideHome: Builder = (key, chance, zones) => ({
  ...homeWithPvb(key, chance, zones),
  name: 'Garden on the slope',
  zones: gardenZones(chance, zones, { lateral: 'pvc-sdr26', ids: (n) => idOf('zone', key, n), hilly: true }),
});

/** Eight zones, a flow sensor, everything measured: the site to learn on. */
export const wellKnownHome: Builder = (key, chance) => ({
  ...homeWithPvb(key, chance, 8),
  sensitiveParts: [
    {
      id: idOf('part', key, 'sensor'),
      kind: 'flow-sensor',
      place: 'Valve box by the driveway',
      sizeIn: 1,
      hasBypass: false,
    },
  ],
  drains: [
    { id: idOf('drain', key, 'upstream'), kind: 'upstream', place: 'Under the water shutoff' },
    { id: idOf('drain', key, 'manual'), kind: 'manual', place: 'Low corner by the mailbox' },
  ],
  mainLine: [run('main', 'pvc-sdr21', 1, 85)],
});
