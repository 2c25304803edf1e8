/** Dimensions of one size of one material, in, and its rating. */
export interface PipeSize {
  outsideDiameterIn: number;
  /** Minimum wall where the standard gives a minimum, the wall otherwise. */
  wallIn: number;
  /** Outside diameter less two walls: the largest bore that the standard allows. */
  nominalInsideDiameterIn: number;
  /** Bore at mid tolerance of the wall; the same as nominal where the bore itself is controlled. */
  averageInsideDiameterIn: number;
  /** Rating for water at 73 F, psi; null where no table was found. */
  ratedPsi: number | null;
}

/** Sizes of one material by nominal size, in. */
export type SizeTable = ReadonlyMap<number, PipeSize>;

/** A row: nominal size, outside diameter, wall, average bore (null where the bore is controlled), rating. */
export type SizeRow = readonly [number, number, number, number | null, number | null];

/** Rounds to thousandths of an inch, as dimension tables print. */
const thousandths = (valueIn: number): number => Math.round(valueIn * 1000) / 1000;

/** A size table from rows. */
export function sizeTable(rows: readonly SizeRow[]): SizeTable {
  return new Map(
    rows.map(([nominalIn, outsideDiameterIn, wallIn, averageIn, ratedPsi]) => {
      const nominalInsideDiameterIn = thousandths(outsideDiameterIn - 2 * wallIn);
      return [
        nominalIn,
        {
          outsideDiameterIn,
          wallIn,
          nominalInsideDiameterIn,
          averageInsideDiameterIn: averageIn ?? nominalInsideDiameterIn,
          ratedPsi,
        },
      ];
    }),
  );
}
