import { photoLimits } from '@rimeward/contracts';

/** Number of parts of a photograph of this size. */
export function partCount(bytes: number): number {
  return Math.ceil(bytes / photoLimits.partBytes);
}

/** Size that a part must have; 0 for a part that does not exist. */
export function partSize(bytes: number, part: number): number {
  if (!Number.isInteger(part) || part < 0 || part >= partCount(bytes)) return 0;
  return Math.min(photoLimits.partBytes, bytes - part * photoLimits.partBytes);
}

/** Parts that are not here in full, ascending. */
export function missingParts(bytes: number, sizes: ReadonlyMap<number, number>): number[] {
  return Array.from({ length: partCount(bytes) }, (_, part) => part).filter(
    (part) => sizes.get(part) !== partSize(bytes, part),
  );
}
