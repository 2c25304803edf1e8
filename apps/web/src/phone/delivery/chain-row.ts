import { emptyChain } from '@rimeward/delivery';
import type { ChainRow } from '../database/schema';

/** A device that has written nothing yet. */
export function emptyChainRow(device: string): ChainRow {
  const start = { ...emptyChain, bytesThrough: 0 };
  return { device, head: start, acknowledged: start };
}
