import { idOf } from '../chance';
import type { Builder } from './homes';
import { backflow, gardenZones, run, zone } from './pieces';

/** Grounds of a school, a park, a clinic, a row of houses. */

export const school: Builder = (key, chance, zones) => ({
  id: idOf('system', key),
  name: 'Sports field and grounds',
  removalMethod: 'blow-out',
  pointOfConnection: { kind: 'street', place: 'Vault by the bus loop' },
  waterShutoff: { place: 'Vault by the bus loop', kind: 'gate' },
  backflow: backflow('RPA', 'Enclosure at the north gate', 2),
  airConnection: {
    kind: 'quick-coupler',
    place: 'Ten feet behind the enclosure',
    downstreamOfBackflow: true,
  },
  mainLine: [
    run('main-a', 'pvc-sdr21', 2, 640),
    run('main-b', 'pvc-sdr21', 2, 410),
    run('main-c', 'pvc-sdr21', 1.5, 260, { guessed: true }),
  ],
  sensitiveParts: [
    {
      id: idOf('part', key, 'sensor'),
      kind: 'flow-sensor',
      place: 'Box behind the enclosure',
      sizeIn: 2,
      hasBypass: false,
    },
    {
      id: idOf('part', key, 'submeter'),
      kind: 'submeter',
      place: 'Vault by the bus loop',
      sizeIn: 2,
      hasBypass: true,
    },
  ],
  controller: { place: 'Boiler room', zoneCount: zones },
  drains: [
    { id: idOf('drain', key, 'upstream'), kind: 'upstream', place: 'Vault floor' },
    { id: idOf('drain', key, 'low'), kind: 'manual', place: 'Low end of the field' },
  ],
  pump: null,
  zones: Array.from({ length: zones }, (_, index) =>
    zone(idOf('zone', key, index + 1), index + 1, {
      name: index < 9 ? `Field, row ${index + 1}` : `Entrance ${index - 8}`,
      kind: index < 9 ? 'rotor' : 'spray',
      count: index < 9 ? chance.whole(6, 9) : chance.whole(7, 12),
      distanceFt: 120 + index * 70,
      elevationFt: chance.whole(-4, 2),
      lateral: 'pvc-sdr21',
    }),
  ),
});

/** Fed from a pond: no drinking water, so no backflow assembly; the pump is drained after, never blown through. */
export const parkWithPump: Builder = (key, chance, zones) => ({
  ...school(key, chance, zones),
  name: 'Park',
  pointOfConnection: { kind: 'pump', place: 'Pump house at the pond' },
  waterShutoff: { place: 'Discharge of the pump', kind: 'gate' },
  backflow: backflow('none', 'None: pond water', null),
  airConnection: { kind: 'quick-coupler', place: 'Outside the pump house', downstreamOfBackflow: true },
  mainLine: [run('main-a', 'pvc-sdr26', 3, 520), run('main-b', 'pvc-sdr26', 2, 480)],
  sensitiveParts: [
    {
      id: idOf('part', key, 'pump'),
      kind: 'pump',
      place: 'Pump house at the pond',
      sizeIn: 3,
      hasBypass: false,
    },
    {
      id: idOf('part', key, 'filter'),
      kind: 'filter',
      place: 'Pump house, discharge side',
      sizeIn: 3,
      hasBypass: true,
    },
  ],
  controller: { place: 'Pump house', zoneCount: zones },
  drains: [{ id: idOf('drain', key, 'low'), kind: 'manual', place: 'Foot of the dam' }],
  pump: { id: idOf('pump', key), place: 'Pump house at the pond' },
});

export const clinic: Builder = (key, chance, zones) => ({
  id: idOf('system', key),
  name: 'Grounds',
  removalMethod: 'blow-out',
  pointOfConnection: { kind: 'building', place: 'Mechanical room' },
  waterShutoff: { place: 'Mechanical room, marked IRR', kind: 'ball' },
  backflow: backflow('RPA', 'Mechanical room', 1.5),
  airConnection: { kind: 'hose-bib', place: 'East wall', downstreamOfBackflow: true },
  mainLine: [run('main', 'pvc-sch40', 1.5, 210), run('main-b', 'pvc-sdr21', 1.25, 160)],
  sensitiveParts: [
    {
      id: idOf('part', key, 'meter'),
      kind: 'flow-meter',
      place: 'Mechanical room',
      sizeIn: 1.5,
      hasBypass: false,
    },
  ],
  controller: { place: 'Mechanical room', zoneCount: zones },
  drains: [{ id: idOf('drain', key, 'upstream'), kind: 'upstream', place: 'Mechanical room floor drain' }],
  pump: null,
  zones: gardenZones(chance, zones, { lateral: 'pvc-sdr21', ids: (n) => idOf('zone', key, n) }),
});
