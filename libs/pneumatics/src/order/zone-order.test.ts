import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { valueOf } from '../testing/fixtures';
import type { OrderedZoneInput } from './ordered-zone';
import { usualOrderWeights, zoneOrder } from './zone-order';

const zone = (
  id: string,
  elevationFt: number | null,
  distanceFt: number | null,
  number = 1,
): OrderedZoneInput => ({
  id,
  number,
  elevationFt,
  distanceFt,
});
const order = (zones: OrderedZoneInput[]) => valueOf(zoneOrder(zones)).places;
const ids = (zones: OrderedZoneInput[]): string[] => order(zones).map(({ zoneId }) => zoneId);

describe('order of zones', () => {
  it('highest and farthest first, then back to the air connection (common practice)', () => {
    const zones = [zone('near', 0, 20), zone('far', 0, 300), zone('high', 15, 300), zone('middle', 6, 150)];
    expect(ids(zones)).toEqual(['high', 'middle', 'far', 'near']);
    expect(order(zones).map(({ reason }) => reason.code)).toEqual([
      'highest-and-farthest',
      'by-height-and-distance',
      'farthest',
      'lowest-and-nearest',
    ]);
  });
  it('height counts 0.6, distance 0.4, and both are stated (the figures are ours)', () => {
    expect(ids([zone('far', 0, 300), zone('high', 10, 0)])).toEqual(['high', 'far']);
    const { why } = valueOf(zoneOrder([zone('a', 0, 0)]));
    expect(why.inputs).toMatchObject({ elevationWeight: 0.6, distanceWeight: 0.4 });
    expect(usualOrderWeights.elevationWeight + usualOrderWeights.distanceWeight).toBe(1);
  });
  it('takes other weights', () => {
    const places = valueOf(
      zoneOrder([zone('far', 0, 300), zone('high', 10, 0)], { elevationWeight: 0.2, distanceWeight: 0.8 }),
    ).places;
    expect(places[0]?.zoneId).toBe('far');
  });
  it('gives each place the figures for its sentence', () => {
    expect(order([zone('a', 12, 90, 4), zone('b', 2, 30, 5)])[0]).toEqual({
      zoneId: 'a',
      place: 1,
      scoreRatio: 1,
      reason: { code: 'highest-and-farthest', params: { elevationFt: 12, distanceFt: 90, number: 4 } },
    });
  });
  it('ties go to the farther zone, then to the lower number, and say so', () => {
    const tied = [zone('b', 5, 50, 2), zone('a', 5, 50, 1), zone('c', 5, 50, 3)];
    expect(ids(tied)).toEqual(['a', 'b', 'c']);
    expect(order(tied).map(({ reason }) => reason.code)).toEqual(['by-height-and-distance', 'tied', 'tied']);
  });
  it('a missing figure counts as the middle and is named', () => {
    const zones = [zone('top', 20, 100), zone('unknown', null, 100), zone('low', 0, 100)];
    expect(ids(zones)).toEqual(['top', 'unknown', 'low']);
    const result = valueOf(zoneOrder(zones));
    expect(result.places[1]?.reason.code).toBe('height-missing');
    expect(result.why.missing).toEqual(['unknown.elevationFt']);
    expect(result.why.assumed).toEqual([
      { field: 'unknown.elevationFt', value: null, why: 'middle-of-the-range' },
    ]);
    expect(order([zone('a', 1, null), zone('b', 2, 5)])[1]?.reason.code).toBe('distance-missing');
  });
  it('zones of which nothing is known go last, by number', () => {
    const zones = [zone('x', null, null, 9), zone('y', null, null, 2), zone('low', -20, 0, 5)];
    expect(ids(zones)).toEqual(['low', 'y', 'x']);
    expect(order(zones)[2]).toMatchObject({ scoreRatio: null, reason: { code: 'nothing-known' } });
  });
  it('one zone, and none', () => {
    expect(order([zone('only', 3, 4)])[0]?.reason.code).toBe('only-zone');
    expect(order([])).toEqual([]);
  });
  it('names highest or farthest alone', () => {
    const codes = order([zone('high', 10, 50), zone('far', 4, 90), zone('low', 0, 10)]).map(
      ({ reason }) => reason.code,
    );
    expect(codes).toEqual(['highest', 'farthest', 'lowest-and-nearest']);
  });
  it('refuses doubled ids, impossible heights and weights, by name', () => {
    expect(zoneOrder([zone('a', 1, 1), zone('a', 2, 2)])).toMatchObject({ error: { field: 'zones' } });
    expect(zoneOrder([zone('a', 9000, 1)])).toMatchObject({ error: { field: 'a.elevationFt' } });
    expect(zoneOrder([zone('a', 1, -1)])).toMatchObject({ error: { field: 'a.distanceFt' } });
    expect(zoneOrder([], { elevationWeight: 0, distanceWeight: 0 })).toMatchObject({
      error: { field: 'weights' },
    });
    expect(zoneOrder([], { elevationWeight: -1, distanceWeight: 5 })).toMatchObject({
      error: { field: 'elevationWeight' },
    });
  });
});

describe('laws of the order', () => {
  const anyZones = fc
    .array(
      fc.record({
        elevationFt: fc.option(fc.integer({ min: -50, max: 100 })),
        distanceFt: fc.option(fc.integer({ min: 0, max: 900 })),
      }),
      { minLength: 1, maxLength: 24 },
    )
    .map((zones) => zones.map((one, at): OrderedZoneInput => ({ id: `z${at}`, number: at + 1, ...one })));

  it('is a permutation with places 1 to n', () => {
    fc.assert(
      fc.property(anyZones, (zones) => {
        const places = order(zones);
        expect(new Set(places.map(({ zoneId }) => zoneId))).toEqual(new Set(zones.map(({ id }) => id)));
        expect(places.map(({ place }) => place)).toEqual(zones.map((_, at) => at + 1));
      }),
    );
  });
  it('does not depend on the order in which zones were written down', () => {
    fc.assert(
      fc.property(anyZones, (zones) => {
        expect(ids([...zones].reverse())).toEqual(ids(zones));
      }),
    );
  });
  it('a zone that is raised, or moved farther out, never moves back', () => {
    fc.assert(
      fc.property(
        anyZones,
        fc.nat(),
        fc.integer({ min: 1, max: 60 }),
        fc.boolean(),
        (zones, pick, more, raise) => {
          const at = pick % zones.length;
          const picked = zones[at];
          if (!picked || picked.elevationFt === null || picked.distanceFt === null) return true;
          const moved: OrderedZoneInput = raise
            ? { ...picked, elevationFt: picked.elevationFt + more }
            : { ...picked, distanceFt: picked.distanceFt + more };
          const known = zones.filter((one) => one.elevationFt !== null && one.distanceFt !== null);
          const before = ids(known).indexOf(picked.id);
          const after = ids(known.map((one) => (one.id === picked.id ? moved : one))).indexOf(picked.id);
          return after <= before;
        },
      ),
    );
  });
});
