import {
  galPerFt3,
  success,
  toAbsolute,
  within,
  type AbsolutePsi,
  type GaugePsi,
  type Result,
} from '@rimeward/units';
import { explain, type Explained } from '../explain/explanation';

/** Air that replaces a zone's water, three ways. None of them is the size of a compressor. */
export interface DisplacementAir extends Explained {
  /** gpm / 7.5, volume at line pressure, ft3/min. */
  ruleCfm: number;
  /** gpm / 7.48052, volume at line pressure, ft3/min. */
  exactCfm: number;
  /** The same air as the compressor takes it in at this altitude, ft3/min of free air. */
  freeAirCfm: number;
}

/**
 * Air to displace a water flow at a line pressure. Flow above 0 to 2000 gpm, pressure 0 to 150 psi gauge, atmosphere 8 to 15.6 psi absolute.
 * Sources: csu-7-5 (second-hand), Boyle (derived).
 */
export function displacementAir(
  flowGpm: number,
  linePsi: GaugePsi,
  atmospherePsia: AbsolutePsi,
): Result<DisplacementAir> {
  const impossible =
    within('flowGpm', flowGpm, 0.01, 2_000) ??
    within('linePsi', linePsi, 0, 150) ??
    within('atmospherePsia', atmospherePsia, 8, 15.6);
  if (impossible) return impossible;
  const exactCfm = flowGpm / galPerFt3;
  return success({
    ruleCfm: flowGpm / 7.5,
    exactCfm,
    freeAirCfm: (exactCfm * toAbsolute(linePsi, atmospherePsia)) / atmospherePsia,
    why: explain('displacement', { flowGpm, linePsi, atmospherePsia }),
  });
}
