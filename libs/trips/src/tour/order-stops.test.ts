import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { seededRandom } from '../random/seeded-random';
import { everyOrder } from '../testing/every-order';
import type { DayRequest, TourStop } from './day-request';
import { placeDay } from './day-places';
import { orderStops, type DayOrder } from './order-stops';
import { lateWeight, weighOrder } from './timed/timed-day';

const yard = { latitude: 41.25, longitude: -96 };
/** At 60 mph and road factor 1, a degree of latitude is 69.09 minutes. */
const travel = { roadFactor: 1, speedMph: 60 };
const stop = (id: string, north: number, window?: TourStop['window'], serviceMinutes = 30): TourStop => ({
  id,
  location: { latitude: yard.latitude + north, longitude: yard.longitude },
  serviceMinutes,
  ...(window ? { window } : {}),
});
const request = (stops: TourStop[], more: Partial<DayRequest> = {}): DayRequest => ({
  yard,
  stops,
  departMinute: 480,
  end: 'yard',
  travel,
  random: seededRandom(5),
  ...more,
});
const ordered = (day: DayRequest): DayOrder => {
  const result = orderStops(day);
  if (!result.ok) throw new Error(JSON.stringify(result.error));
  return result.value;
};
/** The weight the library gives a day, from its printed hours alone. */
const weight = (
  { travelMinutes, lateMinutes, finishMinute }: DayOrder['asGiven'],
  departMinute: number,
): number => lateWeight * lateMinutes + travelMinutes + finishMinute - departMinute;

const anyStops = (most: number, windowed: boolean): fc.Arbitrary<TourStop[]> =>
  fc
    .array(
      fc.record({
        north: fc.double({ min: -0.2, max: 0.2, noNaN: true }),
        east: fc.double({ min: -0.2, max: 0.2, noNaN: true }),
        serviceMinutes: fc.integer({ min: 5, max: 60 }),
        opens: fc.integer({ min: 420, max: 900 }),
        open: fc.integer({ min: 0, max: 300 }),
        free: fc.boolean(),
      }),
      { minLength: 1, maxLength: most },
    )
    .map((all) =>
      all.map(({ north, east, serviceMinutes, opens, open, free }, at) => ({
        id: `s${at}`,
        location: { latitude: yard.latitude + north, longitude: yard.longitude + east },
        serviceMinutes,
        ...(windowed && !free ? { window: { fromMinute: opens, toMinute: opens + open } } : {}),
      })),
    );

describe('orderStops', () => {
  it('drives out and back along a line, with the hours of each stop', () => {
    const day = ordered(
      request([stop('far', 0.3), stop('near', 0.1), stop('middle', 0.2)], { end: 'last-stop' }),
    );
    expect(day.stopIds).toEqual(['near', 'middle', 'far']);
    const leg = 0.1 * ((6371008.8 * Math.PI) / 180 / 1609.344);
    expect(day.schedule[0]).toMatchObject({ stopId: 'near', waitMinutes: 0, lateMinutes: 0 });
    expect(day.schedule[0]?.arriveMinute).toBeCloseTo(480 + leg, 6);
    expect(day.travelMinutes).toBeCloseTo(3 * leg, 6);
    expect(day.serviceMinutes).toBe(90);
    expect(day.finishMinute).toBeCloseTo(480 + 3 * leg + 90, 6);
    expect(day.method).toBe('exact');
  });

  it('ends at the yard, at the last stop or elsewhere', () => {
    const stops = [stop('a', 0.1), stop('b', 0.2)];
    const out = ordered(request(stops, { end: 'last-stop' })).travelMinutes;
    expect(ordered(request(stops)).travelMinutes).toBeCloseTo(2 * out, 6);
    const home = { latitude: yard.latitude + 0.3, longitude: yard.longitude };
    const toHome = ordered(request(stops, { end: home }));
    expect(toHome.travelMinutes).toBeCloseTo(1.5 * out, 6);
    expect(toHome.stopIds).toEqual(['a', 'b']);
    expect(ordered(request([])).finishMinute).toBe(480);
  });

  it('keeps a window that costs driving, and waits where it opens late', () => {
    const day = ordered(request([stop('near', 0.1), stop('far', 0.2, { fromMinute: 480, toMinute: 500 })]));
    expect(day.stopIds).toEqual(['far', 'near']);
    expect(day.lateMinutes).toBe(0);
    const late = ordered(request([stop('only', 0.1, { fromMinute: 600, toMinute: 700 })]));
    expect(late.schedule[0]).toMatchObject({ startMinute: 600, leaveMinute: 630 });
    expect(late.waitMinutes).toBeGreaterThan(100);
  });

  it('reports a window that nobody can keep at its stop, by how many minutes', () => {
    const day = ordered(request([stop('gone', 0.1, { fromMinute: 420, toMinute: 450 }), stop('free', 0.1)]));
    expect(day.stopIds[0]).toBe('gone');
    expect(day.schedule[0]?.lateMinutes).toBeCloseTo((day.schedule[0]?.arriveMinute ?? 0) - 450, 9);
    expect(day.lateMinutes).toBe(day.schedule[0]?.lateMinutes);
  });

  it('visits each stop once, respects every window or says how late, and adds up', () => {
    fc.assert(
      fc.property(anyStops(14, true), (stops) => {
        const day = ordered(request(stops));
        expect([...day.stopIds].sort()).toEqual(stops.map(({ id }) => id).sort());
        let left = 480;
        for (const at of day.schedule) {
          const { window } = stops.find(({ id }) => id === at.stopId) ?? {};
          expect(at.arriveMinute).toBeCloseTo(left + at.travelMinutes, 6);
          expect(at.startMinute).toBeGreaterThanOrEqual(window?.fromMinute ?? 0);
          expect(at.startMinute - at.lateMinutes).toBeLessThanOrEqual((window?.toMinute ?? Infinity) + 1e-9);
          left = at.leaveMinute;
        }
        expect(day.finishMinute).toBeCloseTo(
          480 + day.travelMinutes + day.waitMinutes + day.serviceMinutes,
          6,
        );
      }),
      { numRuns: 12 },
    );
  }, 30_000);

  it('is never worse than the order given: less driving without windows, less weight with', () => {
    fc.assert(
      fc.property(anyStops(25, false), (stops) => {
        const day = ordered(request(stops));
        expect(day.travelMinutes).toBeLessThanOrEqual(day.asGiven.travelMinutes + 1e-6);
      }),
      { numRuns: 25 },
    );
    fc.assert(
      fc.property(anyStops(14, true), (stops) => {
        const day = ordered(request(stops));
        expect(weight(day, 480)).toBeLessThanOrEqual(weight(day.asGiven, 480) + 1e-6);
      }),
      { numRuns: 8 },
    );
  }, 30_000);

  it('finds the best of all orders for up to six stops with windows', () => {
    fc.assert(
      fc.property(anyStops(6, true), (stops) => {
        const day = request(stops);
        const placed = placeDay(day);
        if (!placed.ok) throw new Error(JSON.stringify(placed.error));
        const all = everyOrder(stops.map((_, at) => at + 1)).map((order) =>
          weighOrder(placed.value.day, order),
        );
        expect(weight(ordered(day), 480)).toBeCloseTo(Math.min(...all), 6);
      }),
      { numRuns: 40 },
    );
  });

  it('gives the same day for the same seed', () => {
    fc.assert(
      fc.property(anyStops(20, true), fc.integer(), (stops, seed) => {
        const once = ordered(request(stops, { random: seededRandom(seed) }));
        expect(ordered(request(stops, { random: seededRandom(seed) }))).toEqual(once);
      }),
      { numRuns: 5 },
    );
  }, 30_000);

  it('needs a place and minutes for every stop, all named at once', () => {
    const unknown: TourStop = { id: 'x', location: null, serviceMinutes: null };
    expect(orderStops(request([unknown, { ...stop('y', 0.1), serviceMinutes: null }]))).toEqual({
      ok: false,
      error: {
        kind: 'needs',
        fields: ['stop x: location', 'stop x: serviceMinutes', 'stop y: serviceMinutes'],
      },
    });
  });

  it('refuses impossible stops, windows that close before they open, and doubled ids', () => {
    const refused = (stops: TourStop[], more: Partial<DayRequest> = {}): unknown =>
      orderStops(request(stops, more));
    expect(refused([stop('a', 60)])).toMatchObject({ error: { field: 'stop a.latitude' } });
    expect(refused([stop('a', 0, undefined, -5)])).toMatchObject({
      error: { field: 'stop a: serviceMinutes' },
    });
    expect(refused([stop('a', 0, { fromMinute: 600, toMinute: 500 })])).toMatchObject({
      error: { field: 'stop a: window.toMinute', range: '600 to 1440' },
    });
    expect(refused([stop('a', 0), stop('a', 0.1)])).toMatchObject({ error: { field: 'stops' } });
    expect(refused([stop('a', 0)], { departMinute: -1 })).toMatchObject({ error: { field: 'departMinute' } });
  });

  it('explains what it assumed', () => {
    const day = ordered({ yard, stops: [stop('a', 0.1)], departMinute: 480, random: seededRandom(1) });
    expect(day.explanation.assumed.map(({ field }) => field)).toEqual(['roadFactor', 'speedMph', 'end']);
    expect(day.explanation.formulaId).toBe('order-of-stops-least-driving');
  });
});
