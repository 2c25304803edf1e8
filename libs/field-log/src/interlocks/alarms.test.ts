import { describe, expect, it } from 'vitest';
import { foldVisit } from '../fold/fold-visit';
import { testId } from '../testing/builders';
import { line, written, type Line } from '../testing/clean-visit';
import { airAlarms } from './alarms';

const zoneId = testId(11);
const start = (cycle: number) => line('air-started', { cycleId: testId(cycle), zoneId, gaugePsi: null });
const stop = (cycle: number) => line('air-stopped', { cycleId: testId(cycle), elapsedMs: null });
const alarmsOf = (lines: Line[], minutesLater = 0, capsMs: Record<string, number> = {}) => {
  const log = written(lines);
  const now = Date.parse(log.at(-1)?.time.wall ?? '') + minutesLater * 60_000;
  return airAlarms(foldVisit(log), now, capsMs).map((alarm) => alarm.kind);
};

describe('alarms while air is on', () => {
  it('are silent while a zone is open and the cycle is short, and when air is off', () => {
    expect(alarmsOf([start(21)], 1, { [zoneId]: 120_000 })).toEqual([]);
    expect(alarmsOf([start(21), stop(21)], 90, { [zoneId]: 120_000 })).toEqual([]);
  });

  it('sound at once when the last open zone closes', () => {
    expect(alarmsOf([start(21), line('zone-closed', { zoneId })])).toEqual(['no-open-zone']);
    const other = line('zone-opened', { zoneId: testId(12) });
    expect(alarmsOf([other, start(21), line('zone-closed', { zoneId })])).toEqual([]);
  });

  it('sound past the cap of the zone, not at it, and not for a zone without a cap', () => {
    expect(alarmsOf([start(21)], 2, { [zoneId]: 120_000 })).toEqual([]);
    expect(alarmsOf([start(21)], 2.1, { [zoneId]: 120_000 })).toEqual(['past-cap']);
    expect(alarmsOf([start(21)], 60)).toEqual([]);
  });

  it('sound when air goes on after the zone was dry', () => {
    const dry = line('end-sign-seen', { cycleId: testId(21), sign: 'dry' });
    const mist = line('end-sign-seen', { cycleId: testId(21), sign: 'mist' });
    expect(alarmsOf([start(21), stop(21), dry, start(22)])).toEqual(['after-dry']);
    expect(alarmsOf([start(21), stop(21), mist, start(22)])).toEqual([]);
  });
});
