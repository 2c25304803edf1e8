import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { nodeCodec } from '../testing/node-codec';
import { fullBatch, limitsAfter, makeBatch } from './make-batch';

const entries = fc
  .array(fc.string({ unit: 'grapheme', maxLength: 3_000 }), { maxLength: 250 })
  .map((texts) => texts.map((text, index) => ({ seq: index + 1, text })));

describe('makeBatch', () => {
  it('takes a run from the start, within both limits as the request travels, and as long as it can', () => {
    fc.assert(
      fc.property(entries, fc.integer({ min: 0, max: 12 }), (all, failures) => {
        const limits = limitsAfter(failures);
        const batch = makeBatch(all, limits, nodeCodec);
        const size = (count: number): number =>
          all.slice(0, count).reduce((sum, { text }) => sum + Buffer.byteLength(JSON.stringify(text)) + 1, 0);
        expect(batch).toEqual(all.slice(0, batch.length));
        if (batch.length > 1) expect(size(batch.length)).toBeLessThanOrEqual(limits.bytes);
        expect(batch.length).toBeLessThanOrEqual(limits.entries);
        const couldTakeMore = batch.length < Math.min(all.length, limits.entries);
        if (couldTakeMore) expect(size(batch.length + 1)).toBeGreaterThan(limits.bytes);
      }),
      { numRuns: 60 },
    );
  });

  it('halves after each failure, down to one entry and never to none', () => {
    expect(limitsAfter(0)).toEqual(fullBatch);
    expect(limitsAfter(1)).toEqual({ entries: 50, bytes: 128 * 1024 });
    expect(makeBatch([{ seq: 1, text: 'x'.repeat(64_000) }], limitsAfter(99), nodeCodec).length).toBe(1);
  });
});
