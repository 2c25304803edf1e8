/** Every order of the things given. For small numbers only: it is the slow, sure way to check a quick one. */
export function everyOrder(things: readonly number[]): number[][] {
  if (things.length < 2) return [[...things]];
  return things.flatMap((thing, at) =>
    everyOrder([...things.slice(0, at), ...things.slice(at + 1)]).map((rest) => [thing, ...rest]),
  );
}
