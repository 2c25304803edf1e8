import type { PhotoType } from '@rimeward/contracts';

/** Brands of ISO base media files that hold HEVC still pictures (ISO/IEC 23008-12, annex B). */
const heicBrands = ['heic', 'heix', 'hevc', 'hevx', 'heim', 'heis', 'mif1', 'msf1'];

/** How many bytes from the start `sniffPhotoType` needs. */
export const sniffedBytes = 64;

/**
 * What kind of picture the first bytes announce, whatever the file is called: JPEG (SOI marker), PNG (RFC 2083 signature),
 * WebP (RIFF container), HEIC (ISO base media `ftyp`). Null for anything else.
 */
export function sniffPhotoType(start: Uint8Array): PhotoType | null {
  if (start[0] === 0xff && start[1] === 0xd8 && start[2] === 0xff) return 'image/jpeg';
  if (ascii(start, 0, 8) === '\x89PNG\r\n\x1a\n') return 'image/png';
  if (ascii(start, 0, 4) === 'RIFF' && ascii(start, 8, 12) === 'WEBP') return 'image/webp';
  if (ascii(start, 4, 8) === 'ftyp') {
    const brands = [ascii(start, 8, 12)];
    for (let at = 16; at + 4 <= start.length; at += 4) brands.push(ascii(start, at, at + 4));
    if (heicBrands.includes(brands[0] ?? '')) return 'image/heic';
    if (brands.slice(1).some((brand) => brand === 'heic' || brand === 'heix')) return 'image/heic';
  }
  return null;
}

function ascii(bytes: Uint8Array, from: number, to: number): string {
  return String.fromCharCode(...bytes.subarray(from, to));
}
