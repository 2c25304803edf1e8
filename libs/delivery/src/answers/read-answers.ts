/** The office's word on a push, as far as delivery uses it. */
export interface PushAnswer {
  acknowledgedThrough: number;
  acknowledgedHash: string | null;
  results: { seq: number; result: string; heldReason: string | null }[];
  serverTimeMs: number;
  receipt: string | null;
  missingPhotos: string[];
}

export interface PhotoAnswer {
  sha256: string;
  state: 'complete' | 'partial' | 'refused';
  missingParts: number[];
  hasPreview: boolean;
  refusedBecause: string | null;
}

export interface FeedAnswer {
  epoch: string;
  cursor: number;
  more: boolean;
  items: unknown[];
  serverTimeMs: number;
}

/** Each reader gives null for a body that is not the answer it should be: half a message, or somebody else's. */
export function readPushAnswer(body: unknown): PushAnswer | null {
  const answer = record(body);
  if (answer === null) return null;
  const { acknowledgedThrough, acknowledgedHash, receipt, missingPhotos } = answer;
  const results = all(answer['results'], readResult);
  const serverTimeMs = instant(answer['serverTime']);
  if (!isPlace(acknowledgedThrough) || !isTextOrNull(acknowledgedHash) || !isTextOrNull(receipt)) return null;
  if (results === null || serverTimeMs === null || !isTexts(missingPhotos)) return null;
  return { acknowledgedThrough, acknowledgedHash, results, serverTimeMs, receipt, missingPhotos };
}

export function readAnnounceAnswer(body: unknown): PhotoAnswer[] | null {
  return all(record(body)?.['photos'], readPhotoAnswer);
}

export function readPhotoAnswer(body: unknown): PhotoAnswer | null {
  const answer = record(body);
  if (answer === null) return null;
  const { sha256, state, missingParts, hasPreview, refusedBecause } = answer;
  if (typeof sha256 !== 'string' || typeof hasPreview !== 'boolean') return null;
  if (state !== 'complete' && state !== 'partial' && state !== 'refused') return null;
  if (!Array.isArray(missingParts) || !missingParts.every(isPlace)) return null;
  const why = typeof refusedBecause === 'string' ? refusedBecause : null;
  return { sha256, state, missingParts, hasPreview, refusedBecause: why };
}

export function readFeedAnswer(body: unknown): FeedAnswer | null {
  const answer = record(body);
  if (answer === null) return null;
  const { epoch, cursor, more, items } = answer;
  const serverTimeMs = instant(answer['serverTime']);
  if (typeof epoch !== 'string' || epoch === '' || !isPlace(cursor) || typeof more !== 'boolean') return null;
  if (!Array.isArray(items) || serverTimeMs === null) return null;
  return { epoch, cursor, more, items: items as unknown[], serverTimeMs };
}

function readResult(value: unknown): PushAnswer['results'][number] | null {
  const result = record(value);
  if (result === null || !isPlace(result['seq']) || typeof result['result'] !== 'string') return null;
  const { heldReason } = result;
  return {
    seq: result['seq'],
    result: result['result'],
    heldReason: typeof heldReason === 'string' ? heldReason : null,
  };
}

function all<T>(value: unknown, read: (element: unknown) => T | null): T[] | null {
  if (!Array.isArray(value)) return null;
  const elements: T[] = [];
  for (const element of value as unknown[]) {
    const one = read(element);
    if (one === null) return null;
    elements.push(one);
  }
  return elements;
}

function record(value: unknown): Record<string, unknown> | null {
  return typeof value === 'object' && value !== null && !Array.isArray(value)
    ? (value as Record<string, unknown>)
    : null;
}

function isPlace(value: unknown): value is number {
  return typeof value === 'number' && Number.isSafeInteger(value) && value >= 0;
}

function isTextOrNull(value: unknown): value is string | null {
  return value === null || typeof value === 'string';
}

function isTexts(value: unknown): value is string[] {
  return Array.isArray(value) && value.every((element) => typeof element === 'string');
}

function instant(value: unknown): number | null {
  const ms = typeof value === 'string' ? Date.parse(value) : Number.NaN;
  return Number.isNaN(ms) ? null : ms;
}
