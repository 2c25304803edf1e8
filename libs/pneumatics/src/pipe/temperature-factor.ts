import type { MaterialFamily } from './material';

/** Rows of temperature and factor. Where published sets differ (80 F .88/.90, 110 F .51/.50, 130 F .31/.30) the safer one stands. */
const pvcRows: readonly (readonly [number, number])[] = [
  [73, 1],
  [80, 0.88],
  [90, 0.75],
  [100, 0.62],
  [110, 0.5],
  [115, 0.45],
  [120, 0.4],
  [125, 0.35],
  [130, 0.3],
  [140, 0.22],
];

/** Highest temperature at which PVC pipe is rated at all, F. */
export const pvcHighestF = 140;
/** Highest temperature for which a multiplier of polyethylene is published; above it the maker is asked, F. */
export const polyethyleneHighestF = 100;

/** Straight lines between the rows; 1 up to 73 F; null above 140 F, where PVC is not rated. */
function pvcFactor(temperatureF: number): number | null {
  if (temperatureF <= 73) return 1;
  for (let at = 1; at < pvcRows.length; at += 1) {
    const [lowF = 0, low = 0] = pvcRows[at - 1] ?? [];
    const [highF = 0, high = 0] = pvcRows[at] ?? [];
    if (temperatureF <= highF) return low + ((high - low) * (temperatureF - lowF)) / (highF - lowF);
  }
  return null;
}

/** Steps as printed: 1.0 to 80 F, 0.9 to 90 F, 0.8 to 100 F; null above. */
function polyethyleneFactor(temperatureF: number): number | null {
  if (temperatureF <= 80) return 1;
  if (temperatureF <= 90) return 0.9;
  return temperatureF <= polyethyleneHighestF ? 0.8 : null;
}

/** Soldered joints, 50-50 tin-lead, against their rating at 100 F; steps up to the next printed row; null above 250 F. */
function copperFactor(temperatureF: number, nominalIn: number): number | null {
  const rows =
    nominalIn <= 1 ? [200, 150, 100, 85] : nominalIn <= 2 ? [175, 125, 90, 75] : [150, 100, 75, 50];
  const row = temperatureF <= 100 ? 0 : temperatureF <= 150 ? 1 : temperatureF <= 200 ? 2 : 3;
  return temperatureF > 250 ? null : (rows[row] ?? 0) / (rows[0] ?? 1);
}

/**
 * What is left of a rating at a temperature, as a share of the rating at 73 F (copper: at 100 F); null where the material has no rating
 * at that temperature. Steel: 1. Unknown material: the smaller of PVC and polyethylene. Sources: PPI Recommendation C and two data pages (second-hand), AWWA M55
 * table 4-6 (published), Copper Tube Handbook table 14.4a (published).
 */
export function temperatureFactor(
  family: MaterialFamily,
  temperatureF: number,
  nominalIn: number,
): number | null {
  switch (family) {
    case 'pvc':
      return pvcFactor(temperatureF);
    case 'polyethylene':
      return polyethyleneFactor(temperatureF);
    case 'copper':
      return copperFactor(temperatureF, nominalIn);
    case 'steel':
      return 1;
    case 'unknown':
      return smaller(pvcFactor(temperatureF), polyethyleneFactor(temperatureF));
  }
}

const smaller = (a: number | null, b: number | null): number | null =>
  a === null || b === null ? null : Math.min(a, b);

/** Highest temperature at which a material keeps at least `factor` of its rating, F; Infinity where heat does not count. */
export function hottestForFactor(family: MaterialFamily, factor: number, nominalIn: number): number {
  if (family === 'steel') return Infinity;
  if (family === 'unknown') {
    return Math.min(
      hottestForFactor('pvc', factor, nominalIn),
      hottestForFactor('polyethylene', factor, nominalIn),
    );
  }
  if (family === 'polyethylene') return factor <= 0.8 ? 100 : factor <= 0.9 ? 90 : 80;
  if (family === 'copper') {
    return [250, 200, 150].find((hot) => (copperFactor(hot, nominalIn) ?? 0) >= factor) ?? 100;
  }
  for (let at = pvcRows.length - 1; at > 0; at -= 1) {
    const [lowF = 0, low = 0] = pvcRows[at - 1] ?? [];
    const [highF = 0, high = 0] = pvcRows[at] ?? [];
    if (factor <= high) return highF;
    if (factor <= low) return lowF + ((highF - lowF) * (low - factor)) / (low - high);
  }
  return 73;
}
