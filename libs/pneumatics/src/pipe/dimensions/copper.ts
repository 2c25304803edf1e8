import { sizeTable, type SizeRow, type SizeTable } from './pipe-size';

/** Rating of a 50-50 tin-lead joint at 100 F, the weakest part of a soldered line, psi. */
const jointPsi = (nominalIn: number): number => (nominalIn <= 1 ? 200 : nominalIn <= 2 ? 175 : 150);

/** ASTM B88: outside diameter is the nominal size plus 1/8 in. */
const tube = (rows: readonly (readonly [number, number])[]): SizeTable =>
  sizeTable(
    rows.map(([nominalIn, wallIn]): SizeRow => [
      nominalIn,
      nominalIn + 0.125,
      wallIn,
      null,
      jointPsi(nominalIn),
    ]),
  );

export const copperK = tube([
  [0.5, 0.049],
  [0.75, 0.065],
  [1, 0.065],
  [1.25, 0.065],
  [1.5, 0.072],
  [2, 0.083],
  [2.5, 0.095],
  [3, 0.109],
  [4, 0.134],
]);

export const copperL = tube([
  [0.5, 0.04],
  [0.75, 0.045],
  [1, 0.05],
  [1.25, 0.055],
  [1.5, 0.06],
  [2, 0.07],
  [2.5, 0.08],
  [3, 0.09],
  [4, 0.11],
]);

export const copperM = tube([
  [0.5, 0.028],
  [0.75, 0.032],
  [1, 0.035],
  [1.25, 0.042],
  [1.5, 0.049],
  [2, 0.058],
  [2.5, 0.065],
  [3, 0.072],
  [4, 0.095],
]);
