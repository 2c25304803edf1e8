import fc from 'fast-check';
import geodesic from 'geographiclib-geodesic';
import { describe, expect, it } from 'vitest';
import { readCsv } from '../testing/fixtures';
import { greatCircleM, type GeoPoint } from './great-circle';
import { travelBetween } from './travel-minutes';

const metres = (from: GeoPoint, to: GeoPoint): number => {
  const distance = greatCircleM(from, to);
  if (!distance.ok) throw new Error(JSON.stringify(distance.error));
  return distance.value;
};
const place = fc.record({
  latitude: fc.double({ min: -90, max: 90, noNaN: true }),
  longitude: fc.double({ min: -180, max: 180, noNaN: true }),
});
const denver = { latitude: 39.7392, longitude: -104.9903 };
const springs = { latitude: 38.8339, longitude: -104.8214 };

describe('greatCircleM', () => {
  for (const row of readCsv('geodesic_check.csv')) {
    const [lat1, lon1, lat2, lon2] = ['lat1', 'lon1', 'lat2', 'lon2'].map((column) => Number(row[column]));
    const from = { latitude: lat1 ?? NaN, longitude: lon1 ?? NaN };
    const to = { latitude: lat2 ?? NaN, longitude: lon2 ?? NaN };
    it(`gives the haversine of the check table, within 0.6 % of GeodSolve 2.1.2 (independent): ${lat1},${lon1} to ${lat2},${lon2}`, () => {
      expect(metres(from, to)).toBeCloseTo(Number(row['haversine_R6371008.8_m']), 2);
      const ellipsoid = Number(row['geodesic_wgs84_m_GeodSolve']);
      expect(Math.abs(metres(from, to) / ellipsoid - 1)).toBeLessThan(0.006);
    });
  }

  it('gives the published check values: Omaha to Lincoln within 0.6 % of 81185.231 m (independent, GeodSolve)', () => {
    const omahaToLincoln = metres(
      { latitude: 41.2565, longitude: -95.9345 },
      { latitude: 40.8136, longitude: -96.7026 },
    );
    expect(Math.abs(omahaToLincoln / 81185.231 - 1)).toBeLessThan(0.006);
  });

  it('is within 0.6 % of the WGS 84 ellipsoid anywhere (independent, geographiclib-geodesic 2.2.0)', () => {
    fc.assert(
      fc.property(place, place, (from, to) => {
        const ellipsoid =
          geodesic.Geodesic.WGS84.Inverse(from.latitude, from.longitude, to.latitude, to.longitude).s12 ??
          NaN;
        fc.pre(ellipsoid > 1);
        expect(Math.abs(metres(from, to) / ellipsoid - 1)).toBeLessThan(0.006);
      }),
      { numRuns: 2000 },
    );
  });

  it('is the same both ways, nothing for the same place, and never longer by a third place', () => {
    fc.assert(
      fc.property(place, place, place, (a, b, c) => {
        expect(metres(a, b)).toBeCloseTo(metres(b, a), 6);
        expect(metres(a, a)).toBe(0);
        expect(metres(a, c)).toBeLessThanOrEqual(metres(a, b) + metres(b, c) + 1e-3);
      }),
    );
  });

  it('refuses places off the globe and names the field', () => {
    expect(greatCircleM({ latitude: 91, longitude: 0 }, denver)).toEqual({
      ok: false,
      error: { kind: 'out-of-range', field: 'from.latitude', range: '-90 to 90' },
    });
    expect(greatCircleM(denver, { latitude: 0, longitude: NaN })).toMatchObject({
      error: { field: 'to.longitude' },
    });
  });
});

describe('travelBetween', () => {
  it('drives the straight miles times the road factor at the speed given', () => {
    const travel = travelBetween(denver, springs, { roadFactor: 1.2, speedMph: 60 });
    if (!travel.ok) throw new Error('no travel');
    expect(travel.value.straightMi).toBeCloseTo(101708.949 / 1609.344, 4);
    expect(travel.value.roadMi).toBeCloseTo((101708.949 / 1609.344) * 1.2, 4);
    expect(travel.value.minutes).toBeCloseTo(travel.value.roadMi, 9);
    expect(travel.value.explanation.assumed).toEqual([]);
  });

  it('says that road factor 1.3 and 30 mph are assumed (common practice, no source)', () => {
    const travel = travelBetween(denver, springs);
    if (!travel.ok) throw new Error('no travel');
    expect(travel.value.minutes).toBeCloseTo(((101708.949 / 1609.344) * 1.3 * 60) / 30, 3);
    expect(travel.value.explanation.assumed.map(({ field, value }) => [field, value])).toEqual([
      ['roadFactor', 1.3],
      ['speedMph', 30],
    ]);
  });

  it('takes longer with a larger factor and less long at a higher speed', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 2.9, noNaN: true }),
        fc.double({ min: 1, max: 79, noNaN: true }),
        (roadFactor, speedMph) => {
          const minutes = (factor: number, speed: number): number => {
            const travel = travelBetween(denver, springs, { roadFactor: factor, speedMph: speed });
            return travel.ok ? travel.value.minutes : NaN;
          };
          expect(minutes(roadFactor + 0.1, speedMph)).toBeGreaterThan(minutes(roadFactor, speedMph));
          expect(minutes(roadFactor, speedMph + 1)).toBeLessThan(minutes(roadFactor, speedMph));
        },
      ),
    );
  });

  it('refuses a road factor under 1 and a speed of nothing', () => {
    expect(travelBetween(denver, springs, { roadFactor: 0.9 })).toMatchObject({
      error: { field: 'roadFactor' },
    });
    expect(travelBetween(denver, springs, { speedMph: 0 })).toMatchObject({
      error: { field: 'speedMph', range: '1 to 80' },
    });
  });
});
