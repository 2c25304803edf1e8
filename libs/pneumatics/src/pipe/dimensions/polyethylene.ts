import { sizeTable, type SizeRow, type SizeTable } from './pipe-size';

/** Bores of ASTM D2239 pipe, the same for every SIDR: those of Schedule 40 (figures from memory). */
const boresIn: readonly (readonly [number, number])[] = [
  [0.5, 0.622],
  [0.75, 0.824],
  [1, 1.049],
  [1.25, 1.38],
  [1.5, 1.61],
  [2, 2.067],
  [2.5, 2.469],
  [3, 3.068],
  [4, 4.026],
];

/** Wall = max(0.060 in, bore / SIDR); class printed on the pipe for a design stress of 800 psi. */
const sidr = (ratio: number, classPsi: number): SizeTable =>
  sizeTable(
    boresIn.map(([nominalIn, boreIn]): SizeRow => {
      const wallIn = Math.round(Math.max(0.06, boreIn / ratio) * 1000) / 1000;
      return [nominalIn, boreIn + 2 * wallIn, wallIn, null, classPsi];
    }),
  );

export const polyethyleneSidr7 = sidr(7, 200);
export const polyethyleneSidr9 = sidr(9, 160);
export const polyethyleneSidr11 = sidr(11.5, 125);
export const polyethyleneSidr15 = sidr(15, 100);
export const polyethyleneSidr19 = sidr(19, 80);
