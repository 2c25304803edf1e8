/** The part of an entry that delivery needs: whose chain, which place in it, what it follows. */
export interface EntryHeader {
  device: string;
  seq: number;
  prev: string;
  id: string;
}

const uuid = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/;
const hash = /^[0-9a-f]{64}$/;

/** Header of an entry's exact text; null when the text is not an entry that could ever have been sealed. */
export function readHeader(text: string): EntryHeader | null {
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    return null;
  }
  if (typeof value !== 'object' || value === null) return null;
  const { device, seq, prev, id } = value as Record<string, unknown>;
  if (typeof device !== 'string' || !uuid.test(device)) return null;
  if (typeof id !== 'string' || !uuid.test(id)) return null;
  if (typeof seq !== 'number' || !Number.isSafeInteger(seq) || seq < 1) return null;
  if (typeof prev !== 'string' || !hash.test(prev)) return null;
  return { device, seq, prev, id };
}
