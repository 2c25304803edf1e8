import { idOf } from '../chance';
import { homeWithPvb, type Builder } from './homes';
import { backflow, gardenZones, run } from './pieces';

/** Systems that ask for another way of working. */

/** Polyethylene pipe all through: a lower ceiling than rigid pipe, and soft in the sun. */
export const polyethylene: Builder = (key, chance, zones) => ({
  ...homeWithPvb(key, chance, zones),
  name: 'Garden, polyethylene',
  airConnection: { kind: 'quick-coupler', place: 'Behind the PVB', downstreamOfBackflow: true },
  mainLine: [run('main', 'pe-sidr15', 1, 95), run('main-b', 'pe-sidr19', 0.75, 60, { guessed: true })],
  zones: gardenZones(chance, zones, { lateral: 'pe-sidr19', ids: (n) => idOf('zone', key, n) }),
});

export const manualDrains: Builder = (key, chance, zones) => ({
  ...homeWithPvb(key, chance, zones),
  name: 'Garden with manual drains',
  removalMethod: 'manual-drain',
  drains: ['Low corner', 'By the gate', 'Behind the shed'].map((place, index) => ({
    id: idOf('drain', key, index),
    kind: 'manual' as const,
    place,
  })),
});

export const automaticDrains: Builder = (key, chance, zones) => ({
  ...homeWithPvb(key, chance, zones),
  name: 'Garden with automatic drains',
  removalMethod: 'automatic-drain',
  drains: [
    { id: idOf('drain', key, 'upstream'), kind: 'upstream', place: 'Under the water shutoff' },
    { id: idOf('drain', key, 'auto'), kind: 'automatic', place: 'Low end of each lateral' },
  ],
});

/** Bought with the house: nobody has drawn it, dug it up or found its assembly. */
export const unknownSystem: Builder = (key, chance, zones) => ({
  id: idOf('system', key),
  name: 'Old system, not recorded',
  removalMethod: 'unknown',
  pointOfConnection: { kind: 'unknown', place: 'Not found yet' },
  waterShutoff: { place: 'Not found yet', kind: 'unknown' },
  backflow: backflow('unknown', 'Not found yet', null),
  airConnection: { kind: 'unknown', place: 'Not found yet', downstreamOfBackflow: null },
  mainLine: [],
  sensitiveParts: [],
  controller: { place: 'Garage', zoneCount: null },
  drains: [],
  pump: null,
  zones: gardenZones(chance, zones, { lateral: 'unknown', ids: (n) => idOf('zone', key, n) }).map((zone) => ({
    ...zone,
    name: `Station ${zone.number}`,
    headKind: 'unknown' as const,
    headCount: null,
    flowGpm: null,
    designPressurePsi: null,
    elevationFt: null,
    distanceFt: null,
    laterals: [],
    lowestRatedPart: null,
  })),
});
