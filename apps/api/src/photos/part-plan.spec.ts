import { photoLimits } from '@rimeward/contracts';
import fc from 'fast-check';
import { missingParts, partCount, partSize } from './part-plan';

const bytes = fc.integer({ min: 1, max: photoLimits.originalBytes });

describe('the parts of a photograph', () => {
  it('add up to its size, none larger than a part may be', () => {
    fc.assert(
      fc.property(bytes, (size) => {
        const sizes = Array.from({ length: partCount(size) }, (_, part) => partSize(size, part));
        expect(sizes.reduce((sum, one) => sum + one, 0)).toBe(size);
        expect(Math.max(...sizes)).toBeLessThanOrEqual(photoLimits.partBytes);
        expect(Math.min(...sizes)).toBeGreaterThan(0);
      }),
    );
  });

  it('do not exist outside their number', () => {
    expect([-1, 0.5, partCount(300_000)].map((part) => partSize(300_000, part))).toEqual([0, 0, 0]);
  });

  it('are missing until they are here in full', () => {
    const size = 600_000;
    expect(missingParts(size, new Map())).toEqual([0, 1, 2]);
    expect(
      missingParts(
        size,
        new Map([
          [0, photoLimits.partBytes],
          [1, 17],
        ]),
      ),
    ).toEqual([1, 2]);
  });
});
