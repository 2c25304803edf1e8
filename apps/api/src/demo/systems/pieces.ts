import {
  handValvesOf,
  type BackflowKind,
  type HeadKind,
  type PipeMaterial,
  type System,
  type Zone,
} from '@rimeward/field-log';
import type { Chance } from '../chance';

/** What systems are put together from. Figures are believable for such heads and pipe; none is a maker's. */

type Runs = System['mainLine'];

export function run(
  id: string,
  material: PipeMaterial,
  nominalIn: number,
  lengthFt: number,
  { guessed = false } = {},
): Runs[number] {
  return { id, material, nominalIn, lengthFt, ratedPsi: ratings[material] ?? null, guessed };
}

/** Pressure ratings at 73 F as the standards' names carry them; null where the size decides. */
const ratings: Partial<Record<PipeMaterial, number>> = {
  'pvc-sdr21': 200,
  'pvc-sdr26': 160,
  'pe-sidr15': 100,
  'pe-sidr19': 80,
  'pe-sidr11.5': 125,
};

const heads: Record<
  HeadKind,
  { gpm: number; pressurePsi: number; apartFt: number; part: Zone['lowestRatedPart'] }
> = {
  spray: { gpm: 1.6, pressurePsi: 30, apartFt: 13, part: null },
  rotor: { gpm: 3.2, pressurePsi: 45, apartFt: 32, part: null },
  'rotary-nozzle': { gpm: 0.7, pressurePsi: 40, apartFt: 18, part: null },
  bubbler: { gpm: 1, pressurePsi: 20, apartFt: 10, part: null },
  drip: { gpm: 0.5, pressurePsi: 25, apartFt: 8, part: { name: 'drip tubing', ratedPsi: 60 } },
  mixed: { gpm: 1.8, pressurePsi: 35, apartFt: 16, part: null },
  unknown: { gpm: 2, pressurePsi: 35, apartFt: 15, part: null },
};

export interface ZonePlan {
  name: string;
  kind: HeadKind;
  count: number;
  distanceFt: number;
  elevationFt: number;
  lateral: PipeMaterial;
}

export function zone(id: string, number: number, plan: ZonePlan): Zone {
  const head = heads[plan.kind];
  const lateralFt = Math.round(plan.count * head.apartFt * 0.8);
  const wide = Math.max(10, Math.round(lateralFt * 0.6));
  return {
    id,
    number,
    name: plan.name,
    headKind: plan.kind,
    headCount: plan.count,
    flowGpm: Math.round(plan.count * head.gpm * 10) / 10,
    designPressurePsi: head.pressurePsi,
    elevationFt: plan.elevationFt,
    distanceFt: plan.distanceFt + lateralFt,
    laterals: [
      run(`z${number}-a`, plan.lateral, plan.kind === 'rotor' ? 1.25 : 1, wide),
      run(`z${number}-b`, plan.lateral, 0.75, Math.max(10, lateralFt - wide)),
    ],
    lowestRatedPart: head.part,
  };
}

export function backflow(kind: BackflowKind, place: string, sizeIn: number | null): System['backflow'] {
  const rated = kind === 'none' || kind === 'unknown' ? null : kind === 'RPA' || kind === 'DCVA' ? 175 : 150;
  return { kind, place, sizeIn, ratedPsi: rated, valves: handValvesOf(kind) };
}

const beds = ['Front beds', 'Rose bed', 'Shrubs by the fence', 'Vegetable beds', 'Entry beds'];
const lawns = [
  'Front lawn',
  'Side strip',
  'Back lawn',
  'Back by the shed',
  'Parkway',
  'East lawn',
  'West lawn',
  'Slope',
];

/** Names and heads of a garden's zones, near ones first. Only a hillside's zones lie much higher or lower. */
export function gardenZones(
  chance: Chance,
  count: number,
  {
    lateral,
    ids,
    hilly = false,
  }: { lateral: PipeMaterial; ids: (number: number) => string; hilly?: boolean },
): Zone[] {
  return Array.from({ length: count }, (_, index) => {
    const isBed = index > 1 && chance.often(0.3);
    const kind: HeadKind = isBed
      ? chance.pick(['drip', 'bubbler'] as const)
      : chance.pick(['spray', 'spray', 'rotor', 'rotary-nozzle'] as const);
    return zone(ids(index + 1), index + 1, {
      name: isBed ? chance.pick(beds) : (lawns[index % lawns.length] ?? 'Lawn'),
      kind,
      count: kind === 'rotor' ? chance.whole(3, 6) : chance.whole(4, 10),
      distanceFt: 20 + index * chance.whole(12, 24),
      elevationFt: hilly ? chance.whole(-14, 22) : chance.whole(-2, 3),
      lateral,
    });
  });
}
