/** How long each request may take before it counts as lost, ms. */
export const requestLimitsMs = {
  push: 30_000,
  announce: 30_000,
  preview: 60_000,
  part: 120_000,
  complete: 60_000,
  pull: 30_000,
} as const;

/** Size of every part of a photograph but the last, bytes; the same as in the API's contract. */
export const partBytes = 256 * 1024;

/** Parts of one photograph under way at once. */
export const partsAtOnce = 3;

/** Items asked for in one page of the feed. */
export const feedPageItems = 200;
