/** Gives numbers in [0, 1). Passed in wherever chance is used, so that a result can be repeated. */
export type RandomSource = () => number;

/**
 * A repeatable random source (the 32-bit "mulberry" mixer, from memory): the same seed gives the same numbers on every
 * machine. Good enough to shake a route; not for secrets.
 */
export function seededRandom(seed: number): RandomSource {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
}
