import { galPerFt3, success, within, type AbsolutePsi, type GaugePsi, type Result } from '@rimeward/units';
import { psiPerFtOfWater } from '../atmosphere/air';
import { explain, type Assumption, type Explained } from '../explain/explanation';

/** How fast air drives the water out while the pipe is still full. */
export interface WaterPushed extends Explained {
  flowGpm: number;
  /** Pressure at the front of the air, psi gauge. */
  pressurePsi: number;
  /** Pressure that lifts water over the highest head, psi. */
  liftPsi: number;
  limitedBy: 'heads' | 'compressor' | 'lift';
}

/** What the drive depends on. */
export interface WaterPushedInput {
  flowGpm: number;
  /** Null: the heads are taken to pass the design flow at the line's pressure. */
  designPressurePsi: number | null;
  /** Highest head over the air connection, ft; null: level ground is taken. */
  elevationFt: number | null;
  deliveredCfm: number;
  regulatorPsi: GaugePsi;
}

/**
 * Water that leaves the heads in front of the air: what the heads pass at the regulator's pressure less the lift, or what the
 * compressor's air makes room for where that is less. Zero where the pressure cannot lift the water. Losses of the water in the
 * pipe are left out, so times from it are lower bounds. Sources: orifice equation, Boyle (derived), 62.4 lb/ft3.
 */
export function waterPushed(input: WaterPushedInput, atmospherePsia: AbsolutePsi): Result<WaterPushed> {
  const { flowGpm, designPressurePsi, elevationFt, deliveredCfm, regulatorPsi } = input;
  const impossible =
    within('flowGpm', flowGpm, 0.01, 2_000) ??
    (designPressurePsi === null ? null : within('designPressurePsi', designPressurePsi, 1, 300)) ??
    (elevationFt === null ? null : within('elevationFt', elevationFt, -500, 500)) ??
    within('deliveredCfm', deliveredCfm, 0.1, 5_000) ??
    within('regulatorPsi', regulatorPsi, 0.1, 150) ??
    within('atmospherePsia', atmospherePsia, 8, 15.6);
  if (impossible) return impossible;
  const liftPsi = Math.max(0, elevationFt ?? 0) * psiPerFtOfWater;
  const why = explain(
    'water-pushed',
    { flowGpm, designPressurePsi, elevationFt, deliveredCfm, regulatorPsi, atmospherePsia },
    assumedOf(designPressurePsi, elevationFt),
    missingOf(designPressurePsi, elevationFt),
  );
  if (liftPsi >= regulatorPsi) {
    return success({ flowGpm: 0, pressurePsi: regulatorPsi, liftPsi, limitedBy: 'lift', why });
  }
  const heads = (pressurePsi: number): number =>
    designPressurePsi === null ? flowGpm : flowGpm * Math.sqrt((pressurePsi - liftPsi) / designPressurePsi);
  const room = (pressurePsi: number): number =>
    (deliveredCfm * galPerFt3 * atmospherePsia) / (pressurePsi + atmospherePsia);
  if (heads(regulatorPsi) <= room(regulatorPsi)) {
    return success({
      flowGpm: heads(regulatorPsi),
      pressurePsi: regulatorPsi,
      liftPsi,
      limitedBy: 'heads',
      why,
    });
  }
  let lowPsi = liftPsi;
  let highPsi: number = regulatorPsi;
  for (let step = 0; step < 30; step += 1) {
    const middlePsi = (lowPsi + highPsi) / 2;
    if (heads(middlePsi) < room(middlePsi)) lowPsi = middlePsi;
    else highPsi = middlePsi;
  }
  return success({ flowGpm: room(highPsi), pressurePsi: highPsi, liftPsi, limitedBy: 'compressor', why });
}

const passDesignFlow: Assumption = { field: 'designPressurePsi', value: null, why: 'heads-pass-design-flow' };
const level: Assumption = { field: 'elevationFt', value: 0, why: 'level-ground' };

const none: readonly never[] = [];

function assumedOf(designPressurePsi: number | null, elevationFt: number | null): readonly Assumption[] {
  if (designPressurePsi !== null) return elevationFt === null ? [level] : none;
  return elevationFt === null ? [passDesignFlow, level] : [passDesignFlow];
}

function missingOf(designPressurePsi: number | null, elevationFt: number | null): readonly string[] {
  if (designPressurePsi !== null) return elevationFt === null ? ['elevationFt'] : none;
  return elevationFt === null ? ['designPressurePsi', 'elevationFt'] : ['designPressurePsi'];
}
