import sharp from 'sharp';

/** A picture of more pixels is not decoded: a small file can claim any size. */
const mostPixels = 64_000_000;
const longestSidePx = 1_600;

// A 12-megapixel picture decoded is 36 MB: nothing is cached, and one thread a picture is enough beside the push.
sharp.cache(false);
sharp.concurrency(1);

/**
 * A picture to look at: upright, at most 1,600 px, nothing but pixels (no place, no maker, no inner thumbnail).
 * Null when the input is no whole picture.
 */
export async function makePreview(input: string | Buffer): Promise<Buffer | null> {
  try {
    return await sharp(input, { limitInputPixels: mostPixels, failOn: 'warning' })
      .rotate()
      .resize(longestSidePx, longestSidePx, { fit: 'inside', withoutEnlargement: true })
      .flatten({ background: '#ffffff' })
      .jpeg({ quality: 76, mozjpeg: false })
      .toBuffer();
  } catch (error) {
    if (isAboutTheFile(error)) return null;
    throw error;
  }
}

// The library has no error classes; a missing file is our fault, all else it says is about the picture.
function isAboutTheFile(error: unknown): boolean {
  return error instanceof Error && !/missing|ENOENT|ENOSPC|EACCES/.test(error.message);
}
