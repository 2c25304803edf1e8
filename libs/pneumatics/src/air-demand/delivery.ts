import { absolutePsi, above, success, within, type AbsolutePsi, type Result } from '@rimeward/units';
import { standardAtmosphere } from '../atmosphere/standard-atmosphere';
import { explain, type Explained } from '../explain/explanation';

/** What a compressor gives at an altitude. */
export interface Delivery extends Explained {
  /** Volume at the intake, ft3/min: the rated figure, since a displacement machine draws the same volume everywhere. */
  freeAirCfm: number;
  /** The same air at 14.696 psi, ft3/min: what is left of it as mass. */
  standardAirCfm: number;
  /** Air pressure at the site over that at sea level. */
  pressureRatio: number;
  atmospherePsia: AbsolutePsi;
  /** What an engine without supercharger loses, about 3 % each 1000 ft (from memory); shown, not applied. */
  engineLossPercent: number;
}

/**
 * Delivery of a compressor at a site. Rated free air above 0 to 5000 ft3/min, altitude -1500 to 15000 ft. Source: US Standard
 * Atmosphere 1976 (published); engine loss (memory).
 */
export function compressorDelivery(ratedFreeAirCfm: number, altitudeFt: number): Result<Delivery> {
  const impossible =
    above('freeAirCfm', ratedFreeAirCfm, 0, 5_000) ?? within('altitudeFt', altitudeFt, -1_500, 15_000);
  if (impossible) return impossible;
  const atmosphere = standardAtmosphere(altitudeFt);
  if (!atmosphere.ok) return atmosphere;
  const { pressureRatio, pressurePsia } = atmosphere.value;
  return success({
    freeAirCfm: ratedFreeAirCfm,
    standardAirCfm: ratedFreeAirCfm * pressureRatio,
    pressureRatio,
    atmospherePsia: absolutePsi(pressurePsia),
    engineLossPercent: Math.max(0, (3 * altitudeFt) / 1_000),
    why: explain('compressor-delivery', { freeAirCfm: ratedFreeAirCfm, altitudeFt }),
  });
}
