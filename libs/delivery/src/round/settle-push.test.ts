import { describe, expect, it } from 'vitest';
import { settlePush, type PushFacts } from './settle-push';

const device = 'phone';
const h = (seq: number): string => seq.toString(16).padStart(64, '0');

/** A phone with ten entries, four of them acknowledged, that has sent six. */
function facts(change: Partial<PushFacts> = {}, through = 10, hash: string | null = h(through)): PushFacts {
  return {
    before: { device, head: { seq: 10, hash: h(10) }, acknowledged: { seq: 4, hash: h(4) } },
    headSeq: 10,
    sentEntries: 6,
    answer: {
      acknowledgedThrough: through,
      acknowledgedHash: hash,
      results: [],
      serverTimeMs: 0,
      receipt: 'signed',
      missingPhotos: [],
    },
    ownHash: hash,
    receipt: { device, acknowledgedThrough: through, hash: hash ?? '', verified: true },
    ...change,
  };
}

describe('settlePush', () => {
  it('accepts what a receipt for this device, number and hash covers', () => {
    expect(settlePush(facts())).toEqual({
      kind: 'accept',
      through: { seq: 10, hash: h(10) },
      receiptVerified: true,
    });
    expect(settlePush(facts({}, 7))).toMatchObject({ kind: 'accept', through: { seq: 7 } });
  });

  it('accepts under a signature that it cannot check, and says so', () => {
    const receipt = { device, acknowledgedThrough: 10, hash: h(10), verified: false };
    expect(settlePush(facts({ receipt }))).toMatchObject({ kind: 'accept', receiptVerified: false });
  });

  it.each([
    ['no receipt', null],
    [
      'a receipt of another device',
      { device: 'other', acknowledgedThrough: 10, hash: h(10), verified: true },
    ],
    ['a receipt of another number', { device, acknowledgedThrough: 9, hash: h(10), verified: true }],
    ['a receipt of another hash', { device, acknowledgedThrough: 10, hash: h(9), verified: true }],
  ])('takes nothing out of the outbox under %s', (_, receipt) => {
    expect(settlePush(facts({ receipt }))).toEqual({ kind: 'failed', reason: 'unreadable-answer' });
  });

  it('goes back when the office has less than it had acknowledged', () => {
    expect(settlePush(facts({}, 2))).toEqual({ kind: 'rewind', to: { seq: 2, hash: h(2) } });
    expect(settlePush(facts({}, 0, null))).toMatchObject({ kind: 'rewind', to: { seq: 0 } });
  });

  it('sees another chain under its own name by hash, by number and by the office saying so', () => {
    expect(settlePush(facts({ ownHash: h(99) }))).toEqual({ kind: 'fork' });
    expect(settlePush(facts({ headSeq: 9 }))).toEqual({ kind: 'fork' });
    const forked = facts();
    forked.answer.results = [{ seq: 5, result: 'held', heldReason: 'fork' }];
    expect(settlePush(forked)).toEqual({ kind: 'fork' });
  });

  it('does not take an answer without progress for success', () => {
    expect(settlePush(facts({}, 4))).toEqual({ kind: 'failed', reason: 'no-progress' });
    expect(settlePush(facts({ sentEntries: 0 }, 4))).toMatchObject({ kind: 'accept', through: { seq: 4 } });
  });

  it('has nothing to say about a phone and an office without entries', () => {
    const start = { seq: 0, hash: h(0) };
    const fresh = facts(
      { before: { device, head: start, acknowledged: start }, headSeq: 0, sentEntries: 0, receipt: null },
      0,
      null,
    );
    expect(settlePush(fresh)).toEqual({ kind: 'nothing-new' });
  });
});
