import type { PhotoType } from '@rimeward/contracts';

const heicBrands = ['heic', 'heix', 'hevc', 'heim', 'heis', 'mif1', 'msf1'];

/**
 * Type of a picture by its first bytes, whatever its name says; null when it is none that we take.
 * Signatures: JPEG (ITU T.81, start of image), PNG (W3C PNG, 5.2), WebP (RFC 9649), HEIF (ISO/IEC 23008-12 brands).
 */
export function sniffType(start: Buffer): PhotoType | null {
  if (start.length < 12) return null;
  if (start[0] === 0xff && start[1] === 0xd8 && start[2] === 0xff) return 'image/jpeg';
  if (start.subarray(0, 8).equals(Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a])))
    return 'image/png';
  const word = (from: number): string => start.toString('latin1', from, from + 4);
  if (word(0) === 'RIFF' && word(8) === 'WEBP') return 'image/webp';
  if (word(4) === 'ftyp' && heicBrands.includes(word(8))) return 'image/heic';
  return null;
}
