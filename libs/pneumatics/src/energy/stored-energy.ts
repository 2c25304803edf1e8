import {
  m3PerGal,
  mPerFt,
  paPerPsi,
  success,
  within,
  type AbsolutePsi,
  type GaugePsi,
  type Result,
} from '@rimeward/units';
import { explain, type Explained } from '../explain/explanation';

/** What a screen must say beside the figures, as codes: never a safe distance. */
export const storedEnergyCautions = [
  'everything-closed-by-mistake',
  'code-for-metal-pressure-tests',
  'not-a-safe-distance',
] as const;

/** Energy of pressurised air that is shut in, and of the same pipe full of water. */
export interface StoredEnergy extends Explained {
  volumeGal: number;
  /** ASME PCC-2 equation II-2, J. */
  energyJ: number;
  /** Second opinion, J: Brode, about twice as much. */
  brodeJ: number;
  /** TNT of the same energy, PCC-2 equation II-3, kg. */
  tntKg: number;
  /** Scaled distance of PCC-2 equation III-1, ft. */
  scaledDistanceFt: number;
  /** Distance that the code would ask people to keep in a pressure test, ft; a scale for the danger, not a promise. */
  testDistanceFt: number;
  /** The same pipe full of water at the same pressure, J. */
  waterJ: number;
  /** Air over water. */
  airOverWaterRatio: number;
  cautions: typeof storedEnergyCautions;
}

/** Atmospheric pressure as the code rounds it, Pa; on a mountain the site's own, which gives more energy. */
const codeAtmospherePa = 101_000;
const jPerKgTnt = 4_266_920;
const scaledFactor = 20;
const waterBulkModulusPa = 2.2e9;

/**
 * Energy of air shut in at a pressure. Volume above 0 to 100 000 gal, pressure 0 to 500 psi gauge. Sources: ASME PCC-2 (published),
 * Brode (second-hand), bulk modulus of water (second-hand).
 */
export function storedEnergy(
  volumeGal: number,
  pressurePsi: GaugePsi,
  atmospherePsia: AbsolutePsi,
): Result<StoredEnergy> {
  const impossible =
    within('volumeGal', volumeGal, 1e-6, 100_000) ??
    within('pressurePsi', pressurePsi, 0, 500) ??
    within('atmospherePsia', atmospherePsia, 8, 15.6);
  if (impossible) return impossible;
  const volumeM3 = volumeGal * m3PerGal;
  const gaugePa = pressurePsi * paPerPsi;
  const atmospherePa = Math.min(codeAtmospherePa, atmospherePsia * paPerPsi);
  const totalPa = gaugePa + atmospherePa;
  const energyJ = 2.5 * totalPa * volumeM3 * (1 - (atmospherePa / totalPa) ** 0.286);
  const tntKg = energyJ / jPerKgTnt;
  const scaledDistanceM = scaledFactor * Math.cbrt(2 * tntKg);
  const waterJ = (gaugePa * gaugePa * volumeM3) / (2 * waterBulkModulusPa);
  return success({
    volumeGal,
    energyJ,
    brodeJ: (gaugePa * volumeM3) / 0.4,
    tntKg,
    scaledDistanceFt: scaledDistanceM / mPerFt,
    testDistanceFt: Math.max(scaledDistanceM, leastDistanceM(energyJ)) / mPerFt,
    waterJ,
    airOverWaterRatio: waterJ > 0 ? energyJ / waterJ : 0,
    cautions: storedEnergyCautions,
    why: explain('stored-energy', { volumeGal, pressurePsi, atmospherePsia }),
  });
}

/** The code's own floor: 30 m to 135.5 MJ, 60 m to 271 MJ, the scaled distance above. */
function leastDistanceM(energyJ: number): number {
  if (energyJ <= 135_500_000) return 30;
  return energyJ <= 271_000_000 ? 60 : 0;
}
