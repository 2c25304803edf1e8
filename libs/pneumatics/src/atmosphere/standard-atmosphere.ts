import {
  absolutePsi,
  fFromKelvin,
  mPerFt,
  paPerPsi,
  success,
  within,
  type AbsolutePsi,
  type Result,
} from '@rimeward/units';
import { explain, type Explained } from '../explain/explanation';
import { airDensityKgM3, airGasConstantJPerKgK } from './air';

/** Air at an altitude on a standard day. */
export interface Atmosphere extends Explained {
  pressurePsia: AbsolutePsi;
  pressurePa: number;
  temperatureF: number;
  densityKgM3: number;
  /** Pressure over that at sea level. */
  pressureRatio: number;
}

const earthRadiusM = 6_356_766;
const seaLevelPa = 101_325;
const seaLevelK = 288.15;
const lapseKPerM = 0.0065;
const gravityMPerS2 = 9.80665;
const exponent = gravityMPerS2 / (lapseKPerM * airGasConstantJPerKgK);

/**
 * US Standard Atmosphere 1976 in the lowest layer, with the geopotential step. Altitude -1500 to 15000 ft; refuses what lies outside.
 * Source: us-standard-atmosphere-1976 (published).
 */
export function standardAtmosphere(altitudeFt: number): Result<Atmosphere> {
  const impossible = within('altitudeFt', altitudeFt, -1_500, 15_000);
  if (impossible) return impossible;
  const heightM = altitudeFt * mPerFt;
  const geopotentialM = (earthRadiusM * heightM) / (earthRadiusM + heightM);
  const temperatureK = seaLevelK - lapseKPerM * geopotentialM;
  const pressureRatio = (temperatureK / seaLevelK) ** exponent;
  const pressurePa = seaLevelPa * pressureRatio;
  return success({
    pressurePsia: absolutePsi(pressurePa / paPerPsi),
    pressurePa,
    temperatureF: fFromKelvin(temperatureK),
    densityKgM3: airDensityKgM3(pressurePa, temperatureK),
    pressureRatio,
    why: explain('standard-atmosphere', { altitudeFt }),
  });
}
