import { handValvesOf, type System } from '@rimeward/field-log';
import { randomUUID } from 'node:crypto';

/** A small system with a pressure vacuum breaker and a number of spray zones. */
export function testSystem(zoneCount = 3): System {
  return {
    id: randomUUID(),
    name: 'Front and back',
    removalMethod: 'blow-out',
    pointOfConnection: { kind: 'building', place: 'basement' },
    waterShutoff: { place: 'basement, north wall', kind: 'ball' },
    backflow: { kind: 'PVB', place: 'north side', sizeIn: 1, ratedPsi: 150, valves: handValvesOf('PVB') },
    airConnection: { kind: 'blow-out-fitting', place: 'beside the PVB', downstreamOfBackflow: true },
    mainLine: [
      { id: 'main', material: 'pe-sidr15', nominalIn: 1, lengthFt: 120, ratedPsi: 100, guessed: false },
    ],
    sensitiveParts: [],
    controller: { place: 'garage', zoneCount },
    drains: [],
    pump: null,
    zones: Array.from({ length: zoneCount }, (_, index) => ({
      id: randomUUID(),
      number: index + 1,
      name: `Zone ${index + 1}`,
      headKind: 'spray' as const,
      headCount: 6,
      flowGpm: 9,
      designPressurePsi: 30,
      elevationFt: 0,
      distanceFt: 80,
      laterals: [],
      lowestRatedPart: null,
    })),
  };
}
