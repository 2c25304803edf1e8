import { emptyChain, type ChainHead, type FeedPlace } from '@rimeward/delivery';

export interface DiskPhoto {
  content: Uint8Array;
  type: string;
  state: 'pending' | 'complete' | 'refused' | 'damaged';
}

/** What survives when the phone's page is killed. */
export interface PhoneDisk {
  device: string;
  entries: Map<number, { text: string; hash: string }>;
  outbox: Set<number>;
  head: ChainHead;
  acknowledged: ChainHead;
  receipts: string[];
  photos: Map<string, DiskPhoto>;
  place: FeedPlace;
  /** Positions in the order in which they were applied, of the present epoch. */
  seen: number[];
}

export function emptyPhone(device: string): PhoneDisk {
  return {
    device,
    entries: new Map(),
    outbox: new Set(),
    head: emptyChain,
    acknowledged: emptyChain,
    receipts: [],
    photos: new Map(),
    place: { epoch: null, cursor: 0 },
    seen: [],
  };
}

/** The same storage on a second phone, as a copied profile or a restored backup makes it. */
export function cloned(disk: PhoneDisk): PhoneDisk {
  return {
    ...disk,
    entries: new Map(disk.entries),
    outbox: new Set(disk.outbox),
    receipts: [...disk.receipts],
    photos: new Map(disk.photos),
    seen: [...disk.seen],
  };
}
