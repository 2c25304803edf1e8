import type { System } from '../system/system';
import type { Zone } from '../system/zone';
import { handValvesOf } from '../system/hand-valves';
import { testId } from './builders';

export const testParts = { sensor: testId(31) } as const;
export const testDrains = { upstream: testId(41), manual: testId(42) } as const;
export const testPump = testId(51);

/** A zone with everything known; its number tells its id: zone 1 is `testId(11)`. */
export function testZone(number: number, change: Partial<Zone> = {}): Zone {
  return {
    id: testId(10 + number),
    number,
    name: `Zone ${number}`,
    headKind: 'spray',
    headCount: 6,
    flowGpm: 9,
    designPressurePsi: 30,
    elevationFt: number,
    distanceFt: 60 * number,
    laterals: [
      {
        id: `lateral-${number}`,
        material: 'pvc-sdr21',
        nominalIn: 1,
        lengthFt: 120,
        ratedPsi: 200,
        guessed: false,
      },
    ],
    lowestRatedPart: null,
    ...change,
  };
}

/** A house with a PVB, a flow sensor, two drains and two zones of rigid pipe. */
export function testSystem(change: Partial<System> = {}): System {
  return {
    id: testId(5),
    name: 'Front and back',
    removalMethod: 'blow-out',
    pointOfConnection: { kind: 'building', place: 'Basement' },
    waterShutoff: { place: 'Basement wall', kind: 'ball' },
    backflow: {
      kind: 'PVB',
      place: 'West wall',
      sizeIn: 1,
      ratedPsi: 150,
      valves: handValvesOf('PVB'),
    },
    airConnection: { kind: 'blow-out-fitting', place: 'Below the assembly', downstreamOfBackflow: true },
    mainLine: [
      { id: 'main-1', material: 'pvc-sch40', nominalIn: 1, lengthFt: 80, ratedPsi: 450, guessed: false },
    ],
    sensitiveParts: [
      { id: testParts.sensor, kind: 'flow-sensor', place: 'Second box', sizeIn: 1, hasBypass: false },
    ],
    controller: { place: 'Garage', zoneCount: 2 },
    drains: [
      { id: testDrains.upstream, kind: 'upstream', place: 'Basement' },
      { id: testDrains.manual, kind: 'manual', place: 'Low corner' },
    ],
    pump: null,
    zones: [testZone(1), testZone(2)],
    ...change,
  };
}
