import { expect, it } from 'vitest';
import { distanceM } from './distance';

// One degree of the equator on the sphere of 6,371,008.8 m: 111,195.080 m (haversine, published check of GeodSolve and haversine).
it('is 111,195.08 m for one degree along the equator', () => {
  expect(distanceM({ latitude: 0, longitude: 0 }, { latitude: 0, longitude: 1 })).toBeCloseTo(111_195.08, 1);
});

it('is nothing to the same place, and the same both ways', () => {
  const [one, other] = [
    { latitude: 39.74, longitude: -104.99 },
    { latitude: 38.83, longitude: -104.82 },
  ];
  expect(distanceM(one, one)).toBe(0);
  expect(distanceM(one, other)).toBe(distanceM(other, one));
});
