import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { TourArray } from './tour-array';

/** The tour from place 0 on, in the direction in which its smaller neighbour comes first. */
function asLoop(order: ArrayLike<number>): number[] {
  const places = Array.from(order);
  const start = places.indexOf(0);
  const loop = [...places.slice(start), ...places.slice(0, start)];
  const back = [0, ...loop.slice(1).reverse()];
  return (loop[1] ?? 0) <= (back[1] ?? 0) ? loop : back;
}
const tourOf = (size: number): TourArray => {
  const tour = new TourArray(size);
  tour.load(Array.from({ length: size }, (_, at) => at));
  return tour;
};
const spot = fc.integer({ min: 8, max: 30 }).chain((size) =>
  fc.record({
    size: fc.constant(size),
    start: fc.nat(size - 1),
    length: fc.integer({ min: 1, max: 3 }),
    other: fc.nat(size - 1),
  }),
);

describe('TourArray', () => {
  it('turns a stretch around, or all the rest of the tour, which is the same loop', () => {
    fc.assert(
      fc.property(spot, ({ size, start, other }) => {
        const tour = tourOf(size);
        const rolled = Array.from({ length: size }, (_, at) => (start + at) % size);
        const length = ((other - start + size) % size) + 1;
        tour.turn(start, other);
        const expected = [...rolled.slice(0, length).reverse(), ...rolled.slice(length)];
        expect(asLoop(tour.order)).toEqual(asLoop(expected));
        tour.order.forEach((place, at) => expect(tour.position[place]).toBe(at));
      }),
    );
  });

  it('moves a stretch behind a place, turned around or not, like cutting it out and putting it in', () => {
    fc.assert(
      fc.property(spot, fc.boolean(), ({ size, start, length, other }, turned) => {
        const rolled = Array.from({ length: size }, (_, at) => (start + at) % size);
        const stretch = rolled.slice(0, length);
        fc.pre(!stretch.includes(other));
        const tour = tourOf(size);
        tour.move(start, length, other, turned);
        const expected = rolled.slice(length);
        expected.splice(expected.indexOf(other) + 1, 0, ...(turned ? stretch.reverse() : stretch));
        expect(asLoop(tour.order)).toEqual(asLoop(expected));
        tour.order.forEach((place, at) => expect(tour.position[place]).toBe(at));
      }),
    );
  });
});
