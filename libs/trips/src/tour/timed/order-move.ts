/**
 * A change of an order: the stretch of `length` stops at `from` comes to begin at `to`; with length 0 all stops from
 * `from` to `to` are turned around.
 */
export interface OrderMove {
  from: number;
  to: number;
  length: number;
}

/** First position at which a move changes an order. */
export const firstChanged = (move: OrderMove): number => Math.min(move.from, move.to);

/** Last position at which a move changes an order. */
export const lastChanged = ({ from, to, length }: OrderMove): number =>
  Math.max(from, to) + (length === 0 ? 0 : length - 1);

/** The position in the old order of what stands at a changed position in the new one. */
export function positionBefore({ from, to, length }: OrderMove, position: number): number {
  if (length === 0) return from + to - position;
  if (position >= to && position < to + length) return from + position - to;
  return to > from ? position + length : position - length;
}

/** Every move of a stretch of at most `longest` stops, and every turn, within an order of `stops`. */
export function allMoves(stops: number, longest: number): OrderMove[] {
  const moves: OrderMove[] = [];
  for (let from = 0; from < stops; from++)
    for (let to = 0; to < stops; to++) {
      if (to > from) moves.push({ from, to, length: 0 });
      for (let length = 1; length <= longest && to !== from; length++)
        if (Math.max(from, to) + length <= stops) moves.push({ from, to, length });
    }
  return moves;
}
