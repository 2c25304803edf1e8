import { describe, expect, it } from 'vitest';
import { entry, testId } from '../testing/builders';
import { foldVisit } from './fold-visit';
import { inLogOrder } from './order';

const note = (device: number, seq: number, minute: number) =>
  entry('note-written', { text: `${device}.${seq}` }, { device: testId(device), seq, minute });
const textsOf = (entries: Parameters<typeof inLogOrder>[0]) =>
  inLogOrder(entries).map(({ entry: one }) => (one.type === 'note-written' ? one.body.text : one.type));

describe('order of the log', () => {
  it('goes by estimated time across phones, then by device, then by number', () => {
    expect(textsOf([note(2, 1, 5), note(1, 2, 9), note(1, 1, 5)])).toEqual(['1.1', '2.1', '1.2']);
    expect(textsOf([note(2, 2, 5), note(2, 1, 5), note(1, 1, 5)])).toEqual(['1.1', '2.1', '2.2']);
  });

  it('reckons with the known offset of a clock', () => {
    const ahead = note(2, 1, 30);
    const corrected = { ...ahead, time: { ...ahead.time, offsetMs: -60 * 60_000 } };
    expect(textsOf([note(1, 1, 5), ahead])).toEqual(['1.1', '2.1']);
    expect(textsOf([note(1, 1, 5), corrected])).toEqual(['2.1', '1.1']);
  });

  it('counts one of two rivals for a number, the same one in whatever order they arrive', () => {
    const first = note(1, 1, 1);
    const rival = { ...note(1, 1, 2), id: testId(99_999) };
    expect(inLogOrder([rival, first]).map((one) => one.entry.id)).toEqual([first.id]);
    expect(inLogOrder([first, rival]).map((one) => one.entry.id)).toEqual([first.id]);
  });

  it('counts an id once, even when two phones bring it under their own numbers', () => {
    const first = note(1, 1, 1);
    const copy = { ...note(2, 4, 2), id: first.id };
    expect(inLogOrder([copy, first]).map((one) => one.entry.device)).toEqual([testId(1)]);
  });

  it('keeps what each entry claims beside the time that orders it', () => {
    const [, back] = inLogOrder([note(1, 1, 60), note(1, 2, 0)]);
    expect(Number(back?.atMs) - Number(back?.claimedMs)).toBe(60 * 60_000);
  });
});

describe('air in the fold', () => {
  const start = (cycle: number, seq: number) =>
    entry('air-started', { cycleId: testId(cycle), zoneId: testId(10 + cycle), gaugePsi: null }, { seq });
  const slip = (of: string, seq: number) => entry('corrected', { of, reason: 'slip', body: null }, { seq });

  it('forgets a stop, a sign and a reading that were withdrawn', () => {
    const stop = entry('air-stopped', { cycleId: testId(21), elapsedMs: 9 }, { seq: 2 });
    const sign = entry('end-sign-seen', { cycleId: testId(21), sign: 'dry' }, { seq: 3 });
    const gauge = entry('gauge-read', { cycleId: testId(21), pressurePsi: 50 }, { seq: 4 });
    const log = [start(21, 1), stop, sign, gauge, slip(stop.id, 5), slip(sign.id, 6), slip(gauge.id, 7)];
    const [cycle] = foldVisit(log).runningCycles;
    expect(cycle).toMatchObject({ stopped: null, endSign: null, gaugeReadings: [], durationMs: null });
  });

  it('lists running cycles oldest first', () => {
    const ids = foldVisit([start(23, 3), start(22, 1), start(21, 2)]).runningCycles.map((one) => one.cycleId);
    expect(ids).toEqual([testId(22), testId(21), testId(23)]);
  });

  it('takes the first of two stops, and one start of a cycle', () => {
    const stop = (elapsedMs: number, seq: number) =>
      entry('air-stopped', { cycleId: testId(21), elapsedMs }, { seq });
    const log = [start(21, 1), stop(5_000, 2), start(21, 3), stop(9_000, 4)];
    const cycles = foldVisit(log).zones[testId(31)]?.cycles;
    expect(cycles).toHaveLength(1);
    expect(cycles?.[0]?.durationMs).toBe(5_000);
  });
});
