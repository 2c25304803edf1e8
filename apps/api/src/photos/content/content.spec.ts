import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import sharp from 'sharp';
import { makePreview } from './make-preview';
import { readExif } from './read-exif';
import { sniffType } from './sniff-type';

async function picture(width: number, height: number): Promise<Buffer> {
  return sharp({ create: { width, height, channels: 3, background: '#446622' } })
    .withMetadata({ orientation: 6 })
    .withExif({
      IFD0: { Make: 'Test camera' },
      IFD2: { DateTimeOriginal: '2026:10:12 08:03:05' },
      IFD3: {
        GPSLatitudeRef: 'N',
        GPSLatitude: '39/1 44/1 30/1',
        GPSLongitudeRef: 'W',
        GPSLongitude: '104/1 59/1 0/1',
      },
    })
    .jpeg()
    .toBuffer();
}

describe('the type of a picture', () => {
  it('is told from its bytes', async () => {
    const base = sharp({ create: { width: 4, height: 4, channels: 3, background: '#fff' } });
    expect(sniffType(await base.clone().jpeg().toBuffer())).toBe('image/jpeg');
    expect(sniffType(await base.clone().png().toBuffer())).toBe('image/png');
    expect(sniffType(await base.clone().webp().toBuffer())).toBe('image/webp');
    expect(sniffType(Buffer.from('\0\0\0\x18ftypheic\0\0\0\0', 'latin1'))).toBe('image/heic');
  });

  it.each([
    '<html><script>alert(1)</script></html>',
    '<svg xmlns="x" onload="y"/>',
    '%PDF-1.7 and more',
    'MZ\x90 program',
    '',
  ])('is none for %j', (text) => {
    expect(sniffType(Buffer.from(text, 'latin1'))).toBeNull();
  });
});

describe('a preview', () => {
  it('is upright, at most 1,600 px, and says nothing but pixels', async () => {
    const preview = await makePreview(await picture(2_400, 1_200));
    const facts = await sharp(preview!).metadata();
    expect([facts.format, facts.width, facts.height]).toEqual(['jpeg', 800, 1_600]);
    expect(facts.exif).toBeUndefined();
    expect(preview!.includes('Test camera')).toBe(false);
  });

  it('is not made of half a picture', async () => {
    const whole = await picture(600, 400);
    expect(await makePreview(whole.subarray(0, whole.length / 2))).toBeNull();
    expect(await makePreview(Buffer.from('no picture at all'))).toBeNull();
  });

  it('is not made of more than 64 megapixels', async () => {
    const huge = await sharp({ create: { width: 9_000, height: 8_000, channels: 3, background: '#fff' } })
      .png({ compressionLevel: 1 })
      .toBuffer();
    expect(await makePreview(huge)).toBeNull();
  });
});

describe('the facts of a file', () => {
  it('are read from EXIF', async () => {
    const folder = await mkdtemp(join(tmpdir(), 'exif-'));
    try {
      await writeFile(join(folder, 'a'), await picture(40, 30));
      await writeFile(join(folder, 'b'), 'no picture at all');
      const facts = await readExif(join(folder, 'a'));
      expect(facts).toMatchObject({ Make: 'Test camera', DateTimeOriginal: '2026:10:12 08:03:05' });
      expect(facts?.latitude).toBeCloseTo(39.7417, 3);
      expect(facts?.longitude).toBeCloseTo(-104.9833, 3);
      expect(await readExif(join(folder, 'b'))).toBeNull();
    } finally {
      await rm(folder, { recursive: true });
    }
  });
});
