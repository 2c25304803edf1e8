import type { FoldedEntry, Said } from '../visit/visit-state';

/** Who said it, in which entry, when. */
export function said({ entry, atMs }: FoldedEntry): Said {
  return { entryId: entry.id, device: entry.device, seq: entry.seq, actor: entry.actor, atMs };
}
