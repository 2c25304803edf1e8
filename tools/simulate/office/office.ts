import {
  entryHash,
  noPrevious,
  readHeader,
  type FeedPlace,
  type PhotoToSend,
  type PushBatch,
} from '@rimeward/delivery';
import { codec, sha256Hex } from '../codec';
import type { Seeded } from '../random';
import type { VirtualTime } from '../virtual-time';
import { copyOf, emptyOffice, type OfficeDisk, type Row } from './office-disk';

/** The server was killed: whoever waits for an answer gets none. */
export class ServerDied extends Error {}

/** Ways of building the office wrongly; each must be caught. */
export interface OfficeFlaws {
  /** Stores whatever arrives without asking whether it is known. */
  pushWithoutIdempotency?: boolean;
  /** Hands feed numbers out before the commit, as a sequence does. */
  naiveCursor?: boolean;
  /** Acknowledges before the commit. */
  answersBeforeCommit?: boolean;
}

export interface PushReply {
  acknowledgedThrough: number;
  acknowledgedHash: string | null;
  results: { seq: number; result: string; heldReason?: string }[];
  receipt: string | null;
  missingPhotos: string[];
}

const partBytes = 256 * 1024;

/** A model of the office: the rules of the protocol and nothing else, with slow commits and sudden deaths. */
export class Office {
  disk: OfficeDisk = emptyOffice();
  /** Parts that have not been joined; wiped when the temporary folder is. */
  parts = new Map<string, Map<number, Uint8Array>>();
  /** Every (device, seq, hash) that was ever committed, restored or not. */
  readonly everCommitted = new Set<string>();
  /** Every photograph that was ever whole here, restored or not. */
  readonly everComplete = new Set<string>();
  private readonly announced = new Map<string, number>();
  deathChance = 0;
  private backup: OfficeDisk | null = null;
  private generation = 0;
  private restores = 0;
  private nextId = 1;
  private readonly locks = new Map<string, Promise<unknown>>();

  constructor(
    private readonly time: VirtualTime,
    private readonly random: Seeded,
    private readonly flaws: OfficeFlaws = {},
  ) {}

  push(batch: PushBatch): Promise<PushReply> {
    return this.locked(batch.device, () => this.pushAlone(batch));
  }

  private async pushAlone({ device, entries }: PushBatch): Promise<PushReply> {
    const generation = this.generation;
    const head = { ...(this.disk.chains.get(device) ?? { seq: 0, hash: noPrevious }) };
    const staged: Omit<Row, 'position'>[] = [];
    const results = entries.map((text) => this.take(device, text, head, staged));
    const ids = this.flaws.naiveCursor === true ? staged.map(() => this.nextId++) : null;
    if (this.flaws.answersBeforeCommit === true && this.random.chance(this.deathChance)) {
      return this.reply(device, head, results);
    }
    await this.time.sleep(this.commitMs());
    if (this.random.chance(this.deathChance) || generation !== this.generation) throw new ServerDied();
    for (const [index, row] of staged.entries()) {
      this.disk.rows.push({ ...row, position: ids?.[index] ?? this.disk.rows.length + 1 });
      this.everCommitted.add(`${device}:${row.seq}:${row.hash}`);
    }
    if (head.seq > 0) this.disk.chains.set(device, head);
    if (this.random.chance(this.deathChance)) throw new ServerDied();
    return this.reply(device, head, results);
  }

  /** Most commits are quick; some writer always is slow. */
  private commitMs(): number {
    return this.random.chance(0.15) ? this.random.between(400, 8_000) : this.random.between(1, 100);
  }

  private take(
    device: string,
    text: string,
    head: { seq: number; hash: string },
    staged: Omit<Row, 'position'>[],
  ): PushReply['results'][number] {
    const header = readHeader(text);
    if (header === null || header.device !== device)
      return { seq: 0, result: 'held', heldReason: 'unreadable' };
    const hash = entryHash(header.prev, codec.utf8(text), codec.sha256);
    const { seq } = header;
    const naive = this.flaws.pushWithoutIdempotency === true;
    if (seq <= head.seq && !naive) {
      const known = [...this.disk.rows, ...staged].find(
        (row) => row.device === device && row.seq === seq && row.held !== 'fork',
      );
      if (known?.hash === hash) return { seq, result: 'duplicate' };
      if (![...this.disk.rows, ...staged].some((row) => row.device === device && row.hash === hash)) {
        staged.push({ device, seq, text, hash, held: 'fork' });
      }
      return { seq, result: 'held', heldReason: 'fork' };
    }
    if (seq > head.seq + 1 && !naive) return { seq, result: 'gap' };
    const held = header.prev === head.hash || naive ? null : 'chain-broken';
    staged.push({ device, seq, text, hash, held });
    head.seq = Math.max(head.seq, seq);
    head.hash = hash;
    return held === null ? { seq, result: 'stored' } : { seq, result: 'held', heldReason: held };
  }

  private reply(
    device: string,
    head: { seq: number; hash: string },
    results: PushReply['results'],
  ): PushReply {
    const named = this.disk.rows.flatMap((row) => (row.device === device ? photosOf(row.text) : []));
    return {
      acknowledgedThrough: head.seq,
      acknowledgedHash: head.seq === 0 ? null : head.hash,
      results,
      receipt:
        head.seq === 0 ? null : JSON.stringify({ device, acknowledgedThrough: head.seq, hash: head.hash }),
      missingPhotos: named.filter((sha256) => !this.disk.complete.has(sha256)),
    };
  }

  pull(
    { epoch, cursor }: FeedPlace,
    limit: number,
  ): { epoch: string; cursor: number; more: boolean; items: Row[] } {
    const from = epoch === null || epoch === this.disk.epoch ? cursor : 0;
    const after = this.disk.rows.filter((row) => row.position > from).sort((a, b) => a.position - b.position);
    const items = after.slice(0, limit);
    return {
      epoch: this.disk.epoch,
      cursor: items.at(-1)?.position ?? from,
      more: after.length > limit,
      items,
    };
  }

  announce(photos: readonly PhotoToSend[]) {
    return {
      photos: photos.map(({ sha256, bytes }) => this.photoState(sha256, Math.ceil(bytes / partBytes))),
    };
  }

  storePart(sha256: string, part: number, bytes: Uint8Array) {
    const parts = this.parts.get(sha256) ?? new Map<number, Uint8Array>();
    this.parts.set(sha256, parts.set(part, bytes));
    return this.photoState(sha256, 0);
  }

  /** Null: the parts make another hash, and have been thrown away. */
  async complete(sha256: string) {
    const parts = [...(this.parts.get(sha256) ?? new Map<number, Uint8Array>())].sort(([a], [b]) => a - b);
    const count = this.announced.get(sha256) ?? 0;
    if (parts.length < count) return this.photoState(sha256, count);
    const whole = Buffer.concat(parts.map(([, bytes]) => bytes));
    await this.time.sleep(this.random.between(1, 100));
    if (this.random.chance(this.deathChance)) throw new ServerDied();
    if (sha256Hex(whole) !== sha256) {
      if (!this.disk.complete.has(sha256)) this.parts.delete(sha256);
      return this.disk.complete.has(sha256) ? this.photoState(sha256, 0) : null;
    }
    this.disk.complete.set(sha256, new Uint8Array(whole));
    this.everComplete.add(sha256);
    this.parts.delete(sha256);
    if (this.random.chance(this.deathChance)) throw new ServerDied();
    return this.photoState(sha256, 0);
  }

  private photoState(sha256: string, count: number) {
    const done = this.disk.complete.has(sha256);
    const here = this.parts.get(sha256);
    const missingParts = Array.from({ length: count }, (_, part) => part).filter(
      (part) => here?.has(part) !== true,
    );
    return {
      sha256,
      state: done ? 'complete' : 'partial',
      missingParts: done ? [] : missingParts,
      hasPreview: done,
    };
  }

  takeBackup(): void {
    this.backup = copyOf(this.disk);
  }

  /** Yesterday's backup is put back: a new epoch begins, and everything since then must come from the phones again. */
  restore(): void {
    if (this.backup === null) return;
    this.restores += 1;
    this.generation += 1;
    this.disk = { ...copyOf(this.backup), epoch: `epoch-${this.restores + 1}` };
    this.parts.clear();
  }

  private locked<T>(device: string, work: () => Promise<T>): Promise<T> {
    const before = this.locks.get(device) ?? Promise.resolve();
    const mine = before.then(work, work);
    this.locks.set(
      device,
      mine.catch(() => undefined),
    );
    return mine;
  }
}

function photosOf(text: string): string[] {
  return (JSON.parse(text) as { photos: string[] }).photos;
}
