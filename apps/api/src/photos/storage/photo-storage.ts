import type { Readable } from 'node:stream';

/** A photograph within one company; the company is part of every path and key. */
export interface PhotoKey {
  companyId: string;
  sha256: string;
}

/** All parts in one, hashed, not yet a photograph. */
export interface JoinedPhoto {
  /** Where the storage holds it meanwhile. */
  place: string;
  sha256: string;
  bytes: number;
  /** First bytes, enough to tell the type. */
  start: Buffer;
}

export interface StoredPicture {
  stream: Readable;
  bytes: number;
}

export type PictureKind = 'original' | 'preview';

/** No room left, or a quota reached: nothing was stored, the phone keeps what it has and tries later. */
export class StorageFullError extends Error {
  override readonly name = 'StorageFullError';
}

/** Where photographs lie. An original is either there whole or not at all. */
export abstract class PhotoStorage {
  /** Parts that are here, by number, with their size. */
  abstract partSizes(photo: PhotoKey): Promise<Map<number, number>>;
  /** Repeatable; a part is either whole or absent. */
  abstract writePart(photo: PhotoKey, part: number, bytes: Buffer): Promise<void>;
  /** Null when a part has gone missing. */
  abstract join(photo: PhotoKey, parts: number): Promise<JoinedPhoto | null>;
  /** Makes the joined bytes the original: on the disk for good when this returns. */
  abstract keep(photo: PhotoKey, joined: JoinedPhoto): Promise<void>;
  /** Bytes that are no photograph: kept for a person to look at, never served. */
  abstract setAside(photo: PhotoKey, joined: JoinedPhoto): Promise<void>;
  abstract dropParts(photo: PhotoKey): Promise<void>;
  abstract drop(joined: JoinedPhoto): Promise<void>;
  abstract writePreview(photo: PhotoKey, bytes: Buffer): Promise<void>;
  /** Null when it is not here. */
  abstract open(photo: PhotoKey, kind: PictureKind): Promise<StoredPicture | null>;
  /** A path on this machine from which the original can be read, for what only reads files. */
  abstract localOriginal(photo: PhotoKey): string;
}
