import type { photoFields as contractFields } from '@rimeward/contracts';

/**
 * The contract's figures, repeated here because importing them would bring the schemas beside them, and their library, onto the
 * phone's first route. A test compares the two.
 */
export const photoLimits = {
  originalBytes: 40 * 1024 * 1024,
  previewBytes: 400 * 1024,
  partBytes: 256 * 1024,
} as const;

export const photoFields: typeof contractFields = { part: 'part', preview: 'preview' };
