import { createHash } from 'node:crypto';

/** Seeded chance: the same name always gives the same row of numbers, so that the demo is the same everywhere. */
export class Chance {
  private state: number;

  constructor(name: string) {
    this.state = createHash('sha256').update(name).digest().readUInt32LE(0);
  }

  /** From 0 up to, not including, 1 (mulberry32, public domain). */
  next(): number {
    this.state = (this.state + 0x6d2b79f5) | 0;
    let t = Math.imul(this.state ^ (this.state >>> 15), 1 | this.state);
    t = (t + Math.imul(t ^ (t >>> 7), 61 | t)) ^ t;
    return ((t ^ (t >>> 14)) >>> 0) / 4_294_967_296;
  }

  whole(from: number, to: number): number {
    return from + Math.floor(this.next() * (to - from + 1));
  }

  pick<T>(of: readonly T[]): T {
    const chosen = of[this.whole(0, of.length - 1)];
    if (chosen === undefined) throw new Error('nothing to pick from');
    return chosen;
  }

  /** True with this likelihood. */
  often(likelihood: number): boolean {
    return this.next() < likelihood;
  }
}

/** A uuid that follows from a name: shape and variant of a version 8 uuid (RFC 9562), bits of SHA-256. */
export function idOf(...name: (string | number)[]): string {
  const bytes = createHash('sha256')
    .update(`rimeward demo ${name.join(' ')}`)
    .digest()
    .subarray(0, 16);
  bytes.writeUInt8((bytes.readUInt8(6) & 0x0f) | 0x80, 6);
  bytes.writeUInt8((bytes.readUInt8(8) & 0x3f) | 0x80, 8);
  const hex = bytes.toString('hex');
  return [hex.slice(0, 8), hex.slice(8, 12), hex.slice(12, 16), hex.slice(16, 20), hex.slice(20)].join('-');
}
