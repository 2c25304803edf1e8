import { visitStandings } from '@rimeward/contracts';
import fc from 'fast-check';
import { queueRank } from './queue-rank';

const counts = fc.record({ danger: fc.nat(500), fault: fc.nat(500), gap: fc.nat(500), note: fc.nat(500) });

describe('the order of the queue', () => {
  it('puts a visit with a danger before any without, among those that stand alike', () => {
    fc.assert(
      fc.property(fc.constantFrom(...visitStandings), counts, counts, (standing, one, other) => {
        const dangerous = { ...one, danger: one.danger + 1 };
        expect(queueRank(standing, dangerous)).toBeGreaterThan(queueRank(standing, { ...other, danger: 0 }));
      }),
    );
  });

  it('puts what waits for a decision before what does not', () => {
    fc.assert(
      fc.property(counts, counts, (one, other) => {
        expect(queueRank('to-review', one)).toBeGreaterThan(queueRank('accepted', other));
        expect(queueRank('answered', one)).toBeGreaterThan(queueRank('sent-back', other));
      }),
    );
  });

  it('fits the column it is stored in', () => {
    fc.assert(
      fc.property(fc.constantFrom(...visitStandings), counts, (standing, one) => {
        expect(queueRank(standing, one)).toBeLessThan(2 ** 31);
      }),
    );
  });
});
