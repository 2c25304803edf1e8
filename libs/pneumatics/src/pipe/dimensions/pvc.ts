import { sizeTable, type SizeRow, type SizeTable } from './pipe-size';

/** ASTM D1785, Schedule 40 (outside diameter, minimum wall), published average bores and ratings at 73 F. */
export const pvcSchedule40 = sizeTable([
  [0.5, 0.84, 0.109, 0.608, 600],
  [0.75, 1.05, 0.113, 0.81, 480],
  [1, 1.315, 0.133, 1.033, 450],
  [1.25, 1.66, 0.14, 1.364, 370],
  [1.5, 1.9, 0.145, 1.592, 330],
  [2, 2.375, 0.154, 2.049, 280],
  [2.5, 2.875, 0.203, 2.445, 300],
  [3, 3.5, 0.216, 3.042, 260],
  [4, 4.5, 0.237, 3.998, 220],
]);

/** ASTM D1785, Schedule 80. */
export const pvcSchedule80 = sizeTable([
  [0.5, 0.84, 0.147, 0.528, 850],
  [0.75, 1.05, 0.154, 0.724, 690],
  [1, 1.315, 0.179, 0.935, 630],
  [1.25, 1.66, 0.191, 1.256, 520],
  [1.5, 1.9, 0.2, 1.476, 470],
  [2, 2.375, 0.218, 1.913, 400],
  [2.5, 2.875, 0.276, 2.289, 420],
  [3, 3.5, 0.3, 2.864, 370],
  [4, 4.5, 0.337, 3.786, 320],
]);

/** Average bore of an SDR pipe: half the wall's tolerance, max(0.020 in, 12 %), on each side (derived). */
const averageInsideDiameterIn = (outsideDiameterIn: number, wallIn: number): number =>
  Math.round((outsideDiameterIn - 2 * wallIn - Math.max(0.02, 0.12 * wallIn)) * 1000) / 1000;

const sdr = (classPsi: number, rows: readonly (readonly [number, number, number])[]): SizeTable =>
  sizeTable(
    rows.map(([nominalIn, outsideIn, wallIn]): SizeRow => [
      nominalIn,
      outsideIn,
      wallIn,
      averageInsideDiameterIn(outsideIn, wallIn),
      classPsi,
    ]),
  );

/** ASTM D2241, SDR 13.5, class 315. */
export const pvcSdr13 = sdr(315, [
  [0.5, 0.84, 0.062],
  [0.75, 1.05, 0.078],
  [1, 1.315, 0.097],
  [1.25, 1.66, 0.123],
  [1.5, 1.9, 0.141],
  [2, 2.375, 0.176],
  [2.5, 2.875, 0.213],
  [3, 3.5, 0.259],
  [4, 4.5, 0.333],
]);

/** ASTM D2241, SDR 21, class 200. There is no 1/2 in. */
export const pvcSdr21 = sdr(200, [
  [0.75, 1.05, 0.06],
  [1, 1.315, 0.063],
  [1.25, 1.66, 0.079],
  [1.5, 1.9, 0.09],
  [2, 2.375, 0.113],
  [2.5, 2.875, 0.137],
  [3, 3.5, 0.167],
  [4, 4.5, 0.214],
]);

/** ASTM D2241, SDR 26, class 160. There is no 1/2 and no 3/4 in. */
export const pvcSdr26 = sdr(160, [
  [1, 1.315, 0.06],
  [1.25, 1.66, 0.064],
  [1.5, 1.9, 0.073],
  [2, 2.375, 0.091],
  [2.5, 2.875, 0.11],
  [3, 3.5, 0.135],
  [4, 4.5, 0.173],
]);

/** ASTM D2241, SDR 32.5, class 125. Starts at 1-1/4 in. */
export const pvcSdr32 = sdr(125, [
  [1.25, 1.66, 0.06],
  [1.5, 1.9, 0.06],
  [2, 2.375, 0.073],
  [2.5, 2.875, 0.088],
  [3, 3.5, 0.108],
  [4, 4.5, 0.138],
]);
