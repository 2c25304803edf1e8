import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { foldVisit } from '../fold/fold-visit';
import { visitLogs } from '../testing/arbitraries';
import { cleanVisit, line, written, type Line } from '../testing/clean-visit';
import { testParts, testPump, testSystem } from '../testing/systems';
import { visitSteps, zoneIsDone, type VisitStepId } from './visit-steps';

const system = testSystem();
const stepsOf = (lines: Line[], of = system) => visitSteps(foldVisit(written(lines)), of);
const proposedAfter = (lines: Line[], of = system) =>
  stepsOf(lines, of).find((step) => step.proposed)?.id ?? null;
const statusOf = (id: VisitStepId, lines: Line[], of = system) =>
  stepsOf(lines, of).find((step) => step.id === id);

describe('steps of a visit', () => {
  it('are all done, or not needed, after a clean visit', () => {
    const steps = stepsOf(cleanVisit(system));
    expect(steps.filter((step) => step.status !== 'done').map((step) => step.id)).toEqual(['pump']);
    expect(statusOf('pump', cleanVisit(system))?.status).toBe('not-needed');
    expect(steps.some((step) => step.proposed)).toBe(false);
  });

  it('are proposed in the safe order as the work goes on', () => {
    const proposed: string[] = [];
    const visit = cleanVisit(system);
    for (let count = 0; count <= visit.length; count += 1) {
      const next = proposedAfter(visit.slice(0, count));
      if (next !== null && next !== proposed.at(-1)) proposed.push(next);
    }
    const order = [
      'arrive',
      'walk-through',
      'water-off',
      'relief',
      'backflow-before-air',
      'connect',
      'regulator',
    ];
    const later = [
      'people-clear',
      'air',
      'close-down',
      'backflow-winter',
      'drains',
      'plug',
      'controller',
      'leave',
    ];
    expect(proposed).toEqual([...order, ...later]);
  });

  it('count zones, and take a skipped zone as settled', () => {
    const [first] = system.zones;
    const skip = line('zone-skipped', { zoneId: first?.id ?? '', reason: 'valve is stuck' });
    expect(statusOf('air', [skip])).toMatchObject({ status: 'partly', done: 1, total: 2 });
  });

  it('leave out the air where water is drained, and keep it where nobody knows the system', () => {
    for (const removalMethod of ['manual-drain', 'automatic-drain'] as const) {
      expect(statusOf('air', [], testSystem({ removalMethod }))?.status).toBe('not-needed');
      expect(statusOf('connect', [], testSystem({ removalMethod }))?.status).toBe('not-needed');
      expect(statusOf('drains', [], testSystem({ removalMethod }))?.status).toBe('todo');
    }
    expect(statusOf('air', [], testSystem({ removalMethod: 'unknown' }))?.status).toBe('todo');
  });

  it('follow the method said on arrival over the one on record', () => {
    const [arrival] = cleanVisit(testSystem({ removalMethod: 'manual-drain' }));
    expect(statusOf('air', arrival ? [arrival] : [])?.status).toBe('not-needed');
  });

  it('ask for the pump where there is one', () => {
    const pumped = testSystem({ pump: { id: testPump, place: 'Pump house' } });
    expect(statusOf('pump', [], pumped)?.status).toBe('todo');
    expect(statusOf('pump', cleanVisit(pumped), pumped)?.status).toBe('done');
  });

  it('do not take people as clear while somebody stands in the way', () => {
    const lines = [
      line('cautions-read', { card: 'before-first-air', language: 'en' }),
      line('people-clear', { areaClear: false, eyesAndEars: true }),
    ];
    expect(statusOf('people-clear', lines)?.status).toBe('todo');
  });

  it('propose one step at most, and never count more than there is', () => {
    fc.assert(
      fc.property(visitLogs, (log) => {
        const steps = visitSteps(foldVisit(log), system);
        expect(steps.filter((step) => step.proposed).length).toBeLessThanOrEqual(1);
        for (const { status, done, total } of steps) {
          expect(done).toBeLessThanOrEqual(total);
          expect(status === 'done').toBe(total > 0 && done === total);
        }
      }),
    );
  });

  it('ask for the caution card beside clear people', () => {
    expect(
      statusOf('people-clear', [line('people-clear', { areaClear: true, eyesAndEars: true })])?.status,
    ).toBe('todo');
  });

  it('take a part that was not found as looked for, and one found as open until it is protected', () => {
    const looked = (outcome: 'found' | 'not-found') =>
      statusOf('walk-through', [
        line('part-looked-for', { partId: testParts.sensor, kind: 'flow-sensor', outcome }),
      ])?.status;
    expect([looked('found'), looked('not-found')]).toEqual(['todo', 'done']);
  });

  it.each([
    [['mist'], false],
    [['mist', 'spitting'], false],
    [['spitting', 'mist'], true],
    [['spitting', 'dry'], true],
    [['water', 'water'], false],
  ] as const)('count a zone with cycles that ended in %j as done: %s', (signs, done) => {
    const zoneId = system.zones[0]?.id ?? '';
    const lines = signs.flatMap((sign, index) => {
      const cycleId = `00000000-0000-4000-8000-00000000002${index}`;
      return [
        line('air-started', { cycleId, zoneId, gaugePsi: null }),
        line('air-stopped', { cycleId, elapsedMs: 60_000 }),
        line('end-sign-seen', { cycleId, sign }),
      ];
    });
    expect(zoneIsDone(foldVisit(written(lines)).zones[zoneId])).toBe(done);
  });
});
