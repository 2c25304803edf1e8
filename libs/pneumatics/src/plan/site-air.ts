import { needs, success, type Result } from '@rimeward/units';
import type { Compressor } from '../air-demand/compressor';
import { checkCompressor } from '../air-demand/compressor';
import { compressorDelivery, type Delivery } from '../air-demand/delivery';
import type { AirAround } from '../air-demand/open-heads';
import { standardAtmosphere } from '../atmosphere/standard-atmosphere';
import type { PlanInput } from './plan-input';

/** What all zones of a system share. */
export interface SiteAir {
  around: Result<AirAround>;
  compressor: Result<Compressor>;
  delivery: Result<Delivery>;
}

/** Temperature taken for the density of air where none was given, F: the standard atmosphere at sea level. */
const standardF = 59;

/** The air at the site and what the compressor gives there. Needs altitude and compressor. */
export function siteAir({ equipment, conditions }: PlanInput): SiteAir {
  const { altitudeFt, airTemperatureF } = conditions;
  const compressor = usable(equipment.compressor);
  if (altitudeFt === null) {
    const missing = needs('altitudeFt');
    return { around: missing, compressor, delivery: missing };
  }
  const atmosphere = standardAtmosphere(altitudeFt);
  return {
    around: atmosphere.ok
      ? success({
          atmospherePsia: atmosphere.value.pressurePsia,
          airTemperatureF: airTemperatureF ?? standardF,
        })
      : atmosphere,
    compressor,
    delivery: compressor.ok ? compressorDelivery(compressor.value.freeAirCfm, altitudeFt) : compressor,
  };
}

function usable(compressor: Compressor | null): Result<Compressor> {
  if (!compressor) return needs('compressor');
  return checkCompressor(compressor) ?? success(compressor);
}
