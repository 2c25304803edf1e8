import { createHash } from 'node:crypto';
import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import sharp from 'sharp';

export interface TestPicture {
  path: string;
  sha256: string;
  bytes: number;
}

/** A JPEG of 2 to 4 MB that no other equals, with EXIF as a camera writes it. The noise comes from its number. */
export async function makePicture(folder: string, number: number): Promise<TestPicture> {
  const [width, height] = [1_800, 1_350];
  const pixels = Buffer.alloc(width * height * 3);
  let state = number * 2_654_435_761 + 12_345;
  for (let at = 0; at < pixels.length; at += 1) {
    state = (Math.imul(state, 1_664_525) + 1_013_904_223) | 0;
    pixels[at] = (state >>> 24) & 0xff;
  }
  const file = await sharp(pixels, { raw: { width, height, channels: 3 } })
    .withExif({ IFD0: { ImageDescription: `picture ${number}`, DateTime: '2026:11:30 07:15:00' } })
    .jpeg({ quality: 90 })
    .toBuffer();
  const path = join(folder, `picture-${number}.jpg`);
  writeFileSync(path, file);
  return { path, sha256: createHash('sha256').update(file).digest('hex'), bytes: file.length };
}
