import { describe, expect, it } from 'vitest';
import { entry } from '../testing/builders';
import { foldVisit } from './fold-visit';

const first = entry('regulator-set', { pressurePsi: 60 }, { seq: 1 });
const correct = (seq: number, of: string, body: Record<string, unknown> | null) =>
  entry('corrected', { of, reason: 'read again', body }, { seq });

describe('corrections', () => {
  it('let the latest one rule', () => {
    const log = [first, correct(2, first.id, { pressurePsi: 50 }), correct(3, first.id, { pressurePsi: 45 })];
    expect(foldVisit(log).regulator?.pressurePsi).toBe(45);
  });

  it('can bring a withdrawn entry back with another body', () => {
    const log = [first, correct(2, first.id, null), correct(3, first.id, { pressurePsi: 45 })];
    expect(foldVisit(log).entries[0]?.standing).toBe('corrected');
    expect(foldVisit(log).regulator?.pressurePsi).toBe(45);
  });

  it('can be corrected themselves', () => {
    const wrong = correct(2, first.id, { pressurePsi: 5 });
    const better = correct(3, wrong.id, {
      of: first.id,
      reason: 'a nought was missing',
      body: { pressurePsi: 50 },
    });
    expect(foldVisit([first, wrong, better]).regulator?.pressurePsi).toBe(50);
  });

  it('are applied when they are in the log before their target, on a phone whose clock is behind', () => {
    const early = entry(
      'corrected',
      { of: first.id, reason: 'read again', body: { pressurePsi: 40 } },
      { device: '00000000-0000-4000-8000-000000000002', seq: 1, minute: -90 },
    );
    expect(foldVisit([first, early]).regulator?.pressurePsi).toBe(40);
  });

  it('pass over a body that does not fit, keep the last good word, and say so', () => {
    const good = correct(2, first.id, { pressurePsi: 50 });
    const odd = correct(3, first.id, { pressurePsi: 'fifty' });
    const state = foldVisit([first, good, odd]);
    expect(state.regulator?.pressurePsi).toBe(50);
    expect(state.entries[0]?.ignoredCorrections).toEqual([odd.id]);
    expect(state.entries[0]?.corrections.map((one) => one.id)).toEqual([good.id, odd.id]);
  });

  it('count for nothing when they name each other in a circle', () => {
    const one = entry(
      'corrected',
      { of: '00000000-0000-4000-8000-000000010003', reason: 'a', body: null },
      { seq: 2 },
    );
    const other = entry('corrected', { of: one.id, reason: 'b', body: null }, { seq: 3 });
    const state = foldVisit([first, one, other]);
    expect(state.entries.map((folded) => folded.standing)).toEqual(['standing', 'standing', 'standing']);
  });

  it('fold a chain of 20,000 corrections of corrections without running out of stack', () => {
    const log = [first];
    for (let seq = 2; seq <= 20_001; seq += 1) log.push(correct(seq, log.at(-1)?.id ?? first.id, null));
    // An even number of withdrawals: the last one stands, so every second one falls, and the first entry stands.
    expect(foldVisit(log).entries[0]?.standing).toBe('standing');
    expect(foldVisit(log.slice(0, -1)).entries[0]?.standing).toBe('withdrawn');
  });
});
