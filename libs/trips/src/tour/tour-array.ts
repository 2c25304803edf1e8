/**
 * A closed tour as an array of places with the position of each, so that the place before and after, and turning or
 * moving a stretch, are quick. Stretches wrap around the end of the array.
 */
export class TourArray {
  readonly order: Int32Array;
  readonly position: Int32Array;

  constructor(readonly size: number) {
    this.order = new Int32Array(size);
    this.position = new Int32Array(size);
  }

  /** Takes over an order of all places. */
  load(order: ArrayLike<number>): void {
    for (let at = 0; at < this.size; at++) this.put(at, order[at] as number);
  }

  next(place: number): number {
    const at = (this.position[place] as number) + 1;
    return this.order[at === this.size ? 0 : at] as number;
  }

  previous(place: number): number {
    const at = this.position[place] as number;
    return this.order[at === 0 ? this.size - 1 : at - 1] as number;
  }

  /** The place `steps` after (or before, when negative) a position. */
  at(position: number): number {
    return this.order[this.wrap(position)] as number;
  }

  /** Turns the stretch between two places around, or the rest of the tour when that is shorter: the same tour. */
  turn(first: number, last: number): void {
    let low = this.position[first] as number;
    let high = this.position[last] as number;
    let length = high - low + 1;
    if (length <= 0) length += this.size;
    if (length * 2 > this.size) {
      [low, high] = [high + 1, low - 1];
      length = this.size - length;
    }
    for (let swaps = length >> 1; swaps > 0; swaps--, low++, high--) {
      const placeLow = this.at(low);
      this.put(this.wrap(low), this.at(high));
      this.put(this.wrap(high), placeLow);
    }
  }

  /**
   * Moves the stretch of `length` places that starts at position `start` to stand right after `after`, turned around
   * if wanted. The places between are shifted the shorter way round.
   */
  move(start: number, length: number, after: number, turned: boolean): void {
    const stretch: number[] = [];
    for (let step = 0; step < length; step++) stretch.push(this.at(start + step));
    if (turned) stretch.reverse();
    const ahead = this.wrap((this.position[after] as number) - start - length) + 1;
    const behind = this.size - length - ahead;
    let to = start;
    if (ahead <= behind) {
      for (let step = 0; step < ahead; step++)
        this.put(this.wrap(start + step), this.at(start + length + step));
      to = start + ahead;
    } else {
      for (let step = 1; step <= behind; step++)
        this.put(this.wrap(start + length - step), this.at(start - step));
      to = start - behind;
    }
    for (const [step, place] of stretch.entries()) this.put(this.wrap(to + step), place);
  }

  private wrap(position: number): number {
    const rest = position % this.size;
    return rest < 0 ? rest + this.size : rest;
  }

  private put(at: number, place: number): void {
    this.order[at] = place;
    this.position[place] = at;
  }
}
