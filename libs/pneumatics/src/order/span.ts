/** Least and most of what is known, and where a figure lies between them. */
export interface Span {
  least: number;
  most: number;
  share: (value: number | null) => number;
}

/** Span of the values that are known; a missing value, and any value where all are equal, lies in the middle. */
export function spanOf(values: readonly (number | null)[]): Span {
  let least = Infinity;
  let most = -Infinity;
  for (const value of values) {
    if (value === null) continue;
    least = Math.min(least, value);
    most = Math.max(most, value);
  }
  const share = (value: number | null): number =>
    value === null || most <= least ? 0.5 : (value - least) / (most - least);
  return { least, most, share };
}
