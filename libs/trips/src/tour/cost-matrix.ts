import { outOfRange, type Result, success } from '@rimeward/units';

/** Cost of going from each place to each other, row by row. The same both ways. */
export interface CostMatrix {
  readonly size: number;
  readonly values: Float64Array;
}

/** Fills a matrix from the cost of each pair, asked once with `row < column`. */
export function costMatrix(size: number, cost: (row: number, column: number) => number): CostMatrix {
  const values = new Float64Array(size * size);
  for (let row = 0; row < size; row++)
    for (let column = row + 1; column < size; column++) {
      const value = cost(row, column);
      values[row * size + column] = value;
      values[column * size + row] = value;
    }
  return { size, values };
}

/** Reads one cost. The caller keeps both places inside the matrix. */
export function costOf(costs: CostMatrix, row: number, column: number): number {
  return costs.values[row * costs.size + column] as number;
}

/** Refuses a matrix that is not square, not the same both ways, or holds a negative or unending cost. */
export function checkCosts(costs: CostMatrix): Result<CostMatrix> {
  const { size, values } = costs;
  if (size < 1 || values.length !== size * size) return outOfRange('costs', 'square, at least 1 place');
  for (let row = 0; row < size; row++)
    for (let column = 0; column < size; column++) {
      const cost = costOf(costs, row, column);
      if (!Number.isFinite(cost) || cost < 0) return outOfRange('costs', 'finite and not negative');
      if (cost !== costOf(costs, column, row)) return outOfRange('costs', 'the same both ways');
    }
  return success(costs);
}
