import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { nodeCodec } from '../testing/node-codec';
import { entryHash, noPrevious } from './entry-hash';
import { readHeader } from './entry-header';
import { fromHex, toHex } from './hex';
import { emptyChain, sealEntry, type ChainHead, type SealedEntry } from './seal-entry';
import { verifyChain } from './verify-chain';

const device = '018f6b2a-0000-7000-8000-00000000000d';

function chainOf(bodies: readonly unknown[]): SealedEntry[] {
  let head: ChainHead = emptyChain;
  return bodies.map((body, index) => {
    const id = `018f6b2a-0000-7000-8000-${String(index).padStart(12, '0')}`;
    const sealed = sealEntry({ v: 1, id, device, body }, head, nodeCodec);
    head = sealed;
    return sealed;
  });
}

describe('entryHash', () => {
  it('is SHA-256 over the raw previous hash and the bytes: the digest of FIPS 180-4 for "abc" as a check of the parts', () => {
    const abc = nodeCodec.utf8('abc');
    const fips = 'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad';
    expect(toHex(nodeCodec.sha256(abc))).toBe(fips);
    // Computed apart from this code, with Python's hashlib over the 35 bytes.
    expect(entryHash(fips, abc, nodeCodec.sha256)).toBe(
      '3043d048d0d28ecf94e6eb021f76e69b76a1ead7d7a0d1392696bb2c09c261f1',
    );
    expect(() => entryHash('ba78', abc, nodeCodec.sha256)).toThrow(RangeError);
  });

  it('reads hexadecimal digits and nothing else', () => {
    expect(fromHex('zz')).toBeNull();
    expect(fromHex('abc')).toBeNull();
    fc.assert(
      fc.property(fc.uint8Array(), (bytes) => {
        expect(fromHex(toHex(bytes))).toEqual(bytes);
      }),
    );
  });
});

describe('sealEntry and verifyChain', () => {
  it('seals a chain that verifies, whatever the bodies', () => {
    fc.assert(
      fc.property(fc.array(fc.jsonValue({ stringUnit: 'grapheme' }), { maxLength: 8 }), (bodies) => {
        const sealed = chainOf(bodies);
        const verdict = verifyChain(device, emptyChain, sealed, nodeCodec);
        expect(verdict).toEqual({
          ok: true,
          head: sealed.length === 0 ? emptyChain : { seq: sealed.length, hash: sealed.at(-1)?.hash },
        });
      }),
    );
  });

  it('counts bytes, not characters', () => {
    const [sealed] = chainOf(['ñandú 🌱']);
    expect(sealed?.byteLength).toBe(Buffer.byteLength(sealed?.text ?? '', 'utf8'));
  });

  it.each([
    [
      'a changed text',
      (e: SealedEntry[]) => (e[1]!.text = e[1]!.text.replace('two', 'TWO')),
      1,
      'wrong-hash',
    ],
    ['a missing entry', (e: SealedEntry[]) => e.splice(1, 1), 1, 'wrong-sequence'],
    ['a text cut short', (e: SealedEntry[]) => (e[2]!.text = e[2]!.text.slice(0, 40)), 2, 'unreadable'],
    [
      'a foreign device',
      (e: SealedEntry[]) => (e[0]!.text = e[0]!.text.replace(device, device.replace('d', 'e'))),
      0,
      'other-device',
    ],
    [
      'a different past',
      (e: SealedEntry[]) => (e[0]!.text = e[0]!.text.replace(noPrevious, '1'.repeat(64))),
      0,
      'wrong-previous',
    ],
  ])('finds %s', (_, damage, index, fault) => {
    const sealed = chainOf(['one', 'two', 'three']);
    damage(sealed);
    expect(verifyChain(device, emptyChain, sealed, nodeCodec)).toEqual({ ok: false, index, fault });
  });
});

describe('readHeader', () => {
  it('never throws and takes only what a phone could have sealed', () => {
    fc.assert(
      fc.property(fc.oneof(fc.string(), fc.json()), (text) => {
        expect(readHeader(text)).toBeNull();
      }),
    );
    const [sealed] = chainOf([{}]);
    expect(readHeader(sealed!.text)).toMatchObject({ device, seq: 1, prev: noPrevious });
  });
});
