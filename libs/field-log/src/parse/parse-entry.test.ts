import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { entry } from '../testing/builders';
import { visitLogs } from '../testing/arbitraries';
import { parseEntry } from './parse-entry';
import { upcast } from './upcast';

const plain = entry('regulator-set', { pressurePsi: 50 });
const text = (change: object) => JSON.stringify({ ...plain, ...change });

describe('reading an entry', () => {
  it('reads back what was written', () => {
    fc.assert(
      fc.property(visitLogs, (log) => {
        for (const written of log) {
          const json = JSON.stringify(written);
          const parsed = parseEntry(json);
          if (!parsed.ok) throw new Error(parsed.issues.join());
          expect(parsed.entry).toEqual(JSON.parse(json));
        }
      }),
      { numRuns: 30 },
    );
  });

  it.each([
    ['{"v":1', 'unreadable'],
    ['[]', 'unreadable'],
    ['null', 'unreadable'],
    [text({ device: 'a phone' }), 'unreadable'],
    [text({ v: 2 }), 'unreadable'],
    [text({ type: 'snow-measured' }), 'unknown-type'],
    [text({ type: 'constructor' }), 'unknown-type'],
    [text({ typeVersion: 2 }), 'newer-version'],
    [text({ body: { pressurePsi: 'fifty' } }), 'invalid-body'],
    [text({ body: { pressurePsi: 50, colour: 'red' } }), 'invalid-body'],
  ])('says why it cannot read %s', (given, fault) => {
    const parsed = parseEntry(given);
    expect(parsed).toMatchObject({ ok: false, fault });
    if (!parsed.ok) {
      expect(parsed.issues.length).toBeGreaterThan(0);
      expect(parsed.envelope === null).toBe(fault === 'unreadable');
    }
  });

  it.each(['1970-01-01T00:00:00.000Z', '2099-12-31T23:59:59.999Z'])(
    'takes the date %s as it was told',
    (wall) => {
      expect(parseEntry(text({ time: { ...plain.time, wall } }))).toMatchObject({ ok: true });
    },
  );

  it('never throws, whatever the text', () => {
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.json()), (given) => {
        expect(parseEntry(given).ok).toBe(false);
      }),
    );
  });
});

describe('raising an old body', () => {
  it('goes step by step to the newest version and stops where a step is missing', () => {
    const steps = {
      'regulator-set': {
        [-1]: (body: object) => ({ ...body, a: 1 }),
        0: (body: object) => ({ ...body, b: 2 }),
      },
    };
    expect(upcast('regulator-set', -1, { pressurePsi: 50 }, steps)).toEqual({ pressurePsi: 50, a: 1, b: 2 });
    expect(upcast('regulator-set', 0, { pressurePsi: 50 }, steps)).toEqual({ pressurePsi: 50, b: 2 });
    expect(upcast('regulator-set', 1, { pressurePsi: 50 }, steps)).toEqual({ pressurePsi: 50 });
    expect(upcast('regulator-set', -2, { pressurePsi: 50 }, steps)).toEqual({ pressurePsi: 50 });
  });
});
