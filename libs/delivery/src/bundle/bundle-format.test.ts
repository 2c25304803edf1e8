import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { bundleFirstLine, readBundle, sectionEnd, sectionLine, type BundleSection } from './bundle-format';

const ascii = (text: string): Uint8Array => Buffer.from(text, 'latin1');

function write(sections: readonly BundleSection[]): Uint8Array {
  const pieces = sections.flatMap(({ header, content }) => [
    ascii(sectionLine(header)),
    content,
    ascii(sectionEnd),
  ]);
  return Buffer.concat([ascii(bundleFirstLine), ...pieces]);
}

const section: fc.Arbitrary<BundleSection> = fc.uint8Array({ maxLength: 400 }).chain((content) =>
  fc.oneof(
    fc.constant({ header: { kind: 'manifest' as const, bytes: content.length }, content }),
    fc.nat().map((seq) => ({
      header: { kind: 'entry' as const, device: 'd', seq, hash: 'h', bytes: content.length },
      content,
    })),
    fc.constant({
      header: { kind: 'photo' as const, device: 'd', sha256: 's', type: 'image/png', bytes: content.length },
      content,
    }),
  ),
);

describe('readBundle', () => {
  it('gives back what was written, byte for byte, line feeds in the content included', () => {
    fc.assert(
      fc.property(fc.array(section), (sections) => {
        const reading = readBundle(write(sections));
        expect(reading?.whole).toBe(true);
        expect(reading?.sections.map(({ header }) => header)).toEqual(sections.map(({ header }) => header));
        reading?.sections.forEach(({ content }, index) =>
          expect(Buffer.from(content).equals(Buffer.from(sections[index]?.content ?? []))).toBe(true),
        );
      }),
    );
  });

  it('gives everything before a cut and says that something is missing', () => {
    fc.assert(
      fc.property(
        fc.array(section, { minLength: 1, maxLength: 5 }),
        fc.double({ min: 0, max: 0.999, noNaN: true }),
        (sections, where) => {
          const bytes = write(sections);
          const rest = bytes.length - bundleFirstLine.length;
          const cut = bytes.subarray(0, bundleFirstLine.length + Math.floor(rest * where));
          const reading = readBundle(cut);
          const kept = reading?.sections ?? [];
          expect(kept.map(({ header }) => header)).toEqual(
            sections.slice(0, kept.length).map(({ header }) => header),
          );
          expect(kept.length).toBeLessThan(sections.length);
          expect(reading?.whole).toBe(
            cut.length === bundleFirstLine.length ||
              cut.length === write(sections.slice(0, kept.length)).length,
          );
        },
      ),
    );
  });

  it('takes nothing else for a bundle', () => {
    fc.assert(
      fc.property(fc.uint8Array(), (bytes) => {
        expect(readBundle(bytes)).toBeNull();
      }),
    );
  });
});
