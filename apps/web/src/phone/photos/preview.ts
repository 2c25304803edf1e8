import type { PhotoType } from '@rimeward/contracts';
import { database } from '../database/database';
import { databaseFault } from '../database/faults';
import { wakeDelivery } from '../delivery/wake';
import { photoLimits } from './limits';

/** Longest side of a preview, px. */
const longestSidePx = 1_600;
/** JPEG qualities tried in turn until a preview is small enough to travel. */
const qualities = [0.75, 0.6, 0.45];

let queue: Promise<void> = Promise.resolve();

/**
 * Makes and stores a preview behind the ones asked for before: one decoded picture at a time is what a phone's memory
 * bears. A picture that this browser cannot decode (HEIC outside Safari) simply has no preview.
 */
export function queuePreview(sha256: string, bytes: ArrayBuffer, type: PhotoType): void {
  queue = queue.then(() => makePreview(sha256, bytes, type));
}

async function makePreview(sha256: string, bytes: ArrayBuffer, type: PhotoType): Promise<void> {
  try {
    const db = database();
    if ((await db.previews.get(sha256)) !== undefined) return;
    const preview = await drawPreview(new Blob([bytes], { type }));
    if (preview === null) return;
    await db.previews.put({ sha256, type: preview.type, bytes: await preview.arrayBuffer() });
    wakeDelivery('saved');
  } catch (error) {
    // No room, or not a picture after all: the original is stored and that is what counts.
    if (databaseFault(error) === null && !(error instanceof DOMException)) throw error;
  }
}

/** A JPEG of at most 1,600 px, turned upright as the file's EXIF says; null where pictures cannot be drawn. */
async function drawPreview(file: Blob): Promise<Blob | null> {
  if (typeof createImageBitmap === 'undefined' || typeof OffscreenCanvas === 'undefined') return null;
  const picture = await createImageBitmap(file, { imageOrientation: 'from-image' });
  try {
    const scale = Math.min(1, longestSidePx / Math.max(picture.width, picture.height));
    const canvas = new OffscreenCanvas(
      Math.max(1, Math.round(picture.width * scale)),
      Math.max(1, Math.round(picture.height * scale)),
    );
    const context = canvas.getContext('2d');
    if (context === null) return null;
    context.drawImage(picture, 0, 0, canvas.width, canvas.height);
    for (const quality of qualities) {
      const preview = await canvas.convertToBlob({ type: 'image/jpeg', quality });
      if (preview.size <= photoLimits.previewBytes) return preview;
    }
    return null;
  } finally {
    picture.close();
  }
}
