/** Seeded randomness (mulberry32): one seed, one history. */
export class Seeded {
  private state: number;

  constructor(seed: number) {
    this.state = (seed * 2_654_435_761) >>> 0;
  }

  /** From 0 up to, not including, 1. */
  readonly next = (): number => {
    this.state = (this.state + 0x6d2b79f5) >>> 0;
    let mixed = this.state;
    mixed = Math.imul(mixed ^ (mixed >>> 15), mixed | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };

  chance(probability: number): boolean {
    return this.next() < probability;
  }

  between(least: number, most: number): number {
    return least + this.next() * (most - least);
  }

  whole(least: number, most: number): number {
    return Math.floor(this.between(least, most + 1));
  }

  pick<T>(choices: readonly T[]): T {
    const choice = choices[Math.floor(this.next() * choices.length)];
    if (choice === undefined) throw new Error('nothing to pick from');
    return choice;
  }

  bytes(length: number): Uint8Array {
    return Uint8Array.from({ length }, () => Math.floor(this.next() * 256));
  }

  /** A UUID of version 7's shape. */
  uuid(): string {
    const hex = Array.from({ length: 32 }, () => Math.floor(this.next() * 16).toString(16));
    hex[12] = '7';
    hex[16] = '8';
    const text = hex.join('');
    return [text.slice(0, 8), text.slice(8, 12), text.slice(12, 16), text.slice(16, 20), text.slice(20)].join(
      '-',
    );
  }
}
