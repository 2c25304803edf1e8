/** Any answer at all, before anybody has asked whether it is one of ours. */
export interface HttpAnswer {
  status: number;
  contentType: string | null;
  /** The `Retry-After` header as it came. */
  retryAfter: string | null;
  text: string;
}

/** What became of a request. Without an answer nobody knows whether the office has acted on it. */
export type Sent = { arrived: true; answer: HttpAnswer } | { arrived: false; why: 'no-network' | 'timeout' };

/** Told with every push: what is still on the phone. */
export interface PhoneManifest {
  head: number;
  pendingEntries: number;
  pendingPhotos: number;
  pendingBytes: number;
  oldestPendingWall: string | null;
  appVersion: string;
}

export interface PushBatch {
  device: string;
  manifest: PhoneManifest;
  /** Exact texts, in sequence. */
  entries: string[];
}

export interface PhotoToSend {
  sha256: string;
  bytes: number;
  type: string;
}

/** A reader's place in the company's feed. `epoch` null: nothing has been read yet. */
export interface FeedPlace {
  epoch: string | null;
  cursor: number;
}

/**
 * Carries requests to the office. Each call ends within `limitMs` and never throws for a lost message; what it
 * throws is a fault of the phone itself.
 */
export interface Transport {
  push: (batch: PushBatch, limitMs: number) => Promise<Sent>;
  announce: (photos: readonly PhotoToSend[], limitMs: number) => Promise<Sent>;
  sendPreview: (sha256: string, bytes: Uint8Array, limitMs: number) => Promise<Sent>;
  sendPart: (sha256: string, part: number, bytes: Uint8Array, limitMs: number) => Promise<Sent>;
  complete: (sha256: string, limitMs: number) => Promise<Sent>;
  pull: (place: FeedPlace, limit: number, limitMs: number) => Promise<Sent>;
  /** Asks for a fresh session after a 401 of the feed. */
  renewSession: () => Promise<'renewed' | 'sign-in' | 'no-answer'>;
}
