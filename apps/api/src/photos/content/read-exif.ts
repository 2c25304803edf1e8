import { parse } from 'exifr';

const wanted = [
  'Make',
  'Model',
  'Software',
  'DateTimeOriginal',
  'OffsetTimeOriginal',
  'ModifyDate',
  'Orientation',
  'ExifImageWidth',
  'ExifImageHeight',
  'latitude',
  'longitude',
] as const;

const longestText = 200;

/** What the file says of itself. Facts about the file, not proof of place or time; null when it says nothing readable. */
export async function readExif(path: string): Promise<Record<string, string | number> | null> {
  let tags: unknown;
  try {
    tags = await parse(path, { tiff: true, exif: true, gps: true, reviveValues: false });
  } catch {
    // A damaged header is the sender's: the picture is kept without facts.
    return null;
  }
  if (typeof tags !== 'object' || tags === null) return null;
  const facts: Record<string, string | number> = {};
  for (const name of wanted) {
    const value = (tags as Record<string, unknown>)[name];
    if (typeof value === 'string') facts[name] = plain(value);
    else if (typeof value === 'number' && Number.isFinite(value)) facts[name] = value;
  }
  return Object.keys(facts).length === 0 ? null : facts;
}

/** No control characters (the database has no NUL), no more than a line. */
function plain(text: string): string {
  return text
    .replace(/\p{Cc}|\p{Surrogate}/gu, ' ')
    .trim()
    .slice(0, longestText);
}
