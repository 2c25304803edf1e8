import type { EntryBody, EntryType, PhotoReference } from '@rimeward/field-log';

export type PictureOf = PhotoReference['role'];

/** One entry of a demo visit before it has a phone, a number and a time. */
export interface Line {
  type: EntryType;
  body: EntryBody<EntryType>;
  /** Seconds after the line before. */
  afterSeconds: number;
  pictures: PictureOf[];
}

/** Writes a line whose body fits its type. */
export function line<T extends EntryType>(
  type: T,
  body: EntryBody<T>,
  { afterSeconds = 40, pictures = [] as PictureOf[] } = {},
): Line {
  return { type, body, afterSeconds, pictures };
}
