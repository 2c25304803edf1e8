import type { CostMatrix } from './cost-matrix';
import type { NeighbourLists } from './neighbours';
import { TourArray } from './tour-array';
import { PlaceQueue } from './place-queue';

const longestMovedStretch = 3;

/**
 * Improves a closed tour until neither turning a stretch around (2-opt, croes-1958) nor moving one to three
 * neighbours elsewhere (or-1976) helps. Only moves that put a place beside one of its near neighbours are tried, and
 * only around places where something changed.
 */
export class TourImprover {
  readonly tour: TourArray;
  private readonly queue: PlaceQueue;
  private readonly least: number;

  constructor(
    private readonly costs: CostMatrix,
    private readonly neighbours: NeighbourLists,
  ) {
    this.tour = new TourArray(costs.size);
    this.queue = new PlaceQueue(costs.size);
    // Gains below the rounding of the sums would let the search run in circles.
    this.least = 1e-10 * costs.values.reduce((most, cost) => Math.max(most, Math.abs(cost)), 0);
  }

  /** Takes over an order and marks every place to be looked at. */
  load(order: ArrayLike<number>): void {
    this.tour.load(order);
    for (let place = 0; place < this.costs.size; place++) this.queue.push(place);
  }

  /** Marks a place around which the tour was changed from outside. */
  mark(place: number): void {
    this.queue.push(place);
  }

  /** Improves until nothing around a marked place helps. Gives the change of the tour's cost, 0 or less. */
  improve(): number {
    let change = 0;
    for (let place = this.queue.pop(); place !== undefined; place = this.queue.pop()) {
      let gain = this.tryTurns(place) || this.tryMoves(place);
      while (gain > 0) {
        change -= gain;
        gain = this.tryTurns(place) || this.tryMoves(place);
      }
    }
    return change;
  }

  private cost(a: number, b: number): number {
    return this.costs.values[a * this.costs.size + b] as number;
  }

  private near(place: number, rank: number): number {
    return this.neighbours.values[place * this.neighbours.perPlace + rank] as number;
  }

  /** First 2-opt move around a place that helps: done, and its gain; 0 when there is none. */
  private tryTurns(place: number): number {
    const { tour } = this;
    for (const ahead of [true, false]) {
      const beside = ahead ? tour.next(place) : tour.previous(place);
      const given = this.cost(place, beside);
      for (let rank = 0; rank < this.neighbours.perPlace; rank++) {
        const near = this.near(place, rank);
        const first = given - this.cost(place, near);
        if (first <= this.least) break;
        const besideNear = ahead ? tour.next(near) : tour.previous(near);
        const gain = first + this.cost(near, besideNear) - this.cost(beside, besideNear);
        if (gain <= this.least) continue;
        if (ahead) tour.turn(beside, near);
        else tour.turn(near, beside);
        this.changed(place, beside, near, besideNear);
        return gain;
      }
    }
    return 0;
  }

  /** First move of a stretch ending at a place that helps: done, and its gain; 0 when there is none. */
  private tryMoves(place: number): number {
    const longest = Math.min(longestMovedStretch, this.costs.size - 3);
    for (let length = 1; length <= longest; length++)
      for (const ahead of length === 1 ? [true] : [true, false]) {
        const gain = this.tryStretch(place, length, ahead);
        if (gain > 0) return gain;
      }
    return 0;
  }

  /** Stretch of `length` places from `place` on (or up to it), put with `place` beside one of its neighbours. */
  private tryStretch(place: number, length: number, ahead: boolean): number {
    const { tour } = this;
    const start = (tour.position[place] as number) - (ahead ? 0 : length - 1);
    const far = tour.at(ahead ? start + length - 1 : start);
    const before = tour.at(start - 1);
    const after = tour.at(start + length);
    const [first, last] = ahead ? [place, far] : [far, place];
    const freed = this.cost(before, first) + this.cost(last, after) - this.cost(before, after);
    for (let rank = 0; rank < this.neighbours.perPlace; rank++) {
      const near = this.near(place, rank);
      const left = freed - this.cost(place, near);
      if (left <= this.least) return 0;
      if (this.inStretch(near, start, length)) continue;
      for (const behindNear of [true, false]) {
        const other = behindNear ? tour.next(near) : tour.previous(near);
        if (this.inStretch(other, start, length)) continue;
        const gain = left + this.cost(near, other) - this.cost(far, other);
        if (gain <= this.least) continue;
        // Behind `near` the stretch has to begin with `place`; before it, to end with it.
        tour.move(start, length, behindNear ? near : other, behindNear !== ahead);
        this.changed(before, after, place, far);
        this.changed(near, other);
        return gain;
      }
    }
    return 0;
  }

  private inStretch(place: number, start: number, length: number): boolean {
    const size = this.costs.size;
    const offset = ((this.tour.position[place] as number) - start + 2 * size) % size;
    return offset < length;
  }

  private changed(...places: number[]): void {
    for (const place of places) this.queue.push(place);
  }
}
