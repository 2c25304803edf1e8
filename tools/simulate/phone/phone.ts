import {
  sealEntry,
  startLoop,
  type DeliveryLoop,
  type LoopStatus,
  type ReceiptReading,
} from '@rimeward/delivery';
import { codec, sha256Hex } from '../codec';
import type { Network } from '../network';
import type { Office } from '../office/office';
import type { Seeded } from '../random';
import type { VirtualTime } from '../virtual-time';
import { emptyPhone, type PhoneDisk } from './phone-disk';
import { phoneStore, type Transact, type Watch } from './phone-store';
import { phoneTransport } from './phone-transport';

/** An entry that the screen has called saved. */
export interface SavedEntry {
  seq: number;
  text: string;
  hash: string;
}

class StorageFailed extends Error {}

/**
 * A phone: a disk that survives, and pages on it that do not. Each page runs the real delivery loop; two pages at once are
 * a browser without Web Locks.
 */
export class Phone {
  readonly disk: PhoneDisk;
  /** What the screen has called saved; kept outside the disk, as a person's memory is. */
  readonly saved: SavedEntry[] = [];
  lastStatus: LoopStatus | null = null;
  crashChance = 0;
  storageFaultChance = 0;
  /** Added to the wall clock; a person may change it at any time. */
  clockErrorMs = 0;
  watch: Watch = { acknowledged: () => undefined, photoComplete: () => undefined };
  private pages: Page[] = [];

  constructor(
    private readonly time: VirtualTime,
    private readonly random: Seeded,
    private readonly office: Office,
    private readonly network: Network,
    private readonly pagesAtOnce: number,
    disk: PhoneDisk | null = null,
  ) {
    this.disk = disk ?? emptyPhone(random.uuid());
  }

  open(): void {
    while (this.pages.length < this.pagesAtOnce) this.pages.push(new Page(this.time));
    for (const page of this.pages) if (page.loop === null) page.loop = this.deliver(page);
  }

  /** The browser is killed with all its pages, and opened again a little later. */
  kill(): void {
    for (const page of this.pages) page.alive = false;
    this.pages = [];
    void this.time.sleep(this.random.between(500, 30_000)).then(() => this.open());
  }

  /** Somebody taps save. The promise settles only if the page lives to see the commit. */
  async save(photoBytes: number | null): Promise<void> {
    const page = this.pages[0];
    if (page === undefined) return;
    const content = photoBytes === null ? null : this.random.bytes(photoBytes);
    const sha256 = content === null ? null : sha256Hex(content);
    const entry = await this.transact(page)(() => {
      if (sha256 !== null && content !== null)
        this.disk.photos.set(sha256, { content, type: 'image/jpeg', state: 'pending' });
      const envelope = {
        v: 1,
        id: this.random.uuid(),
        device: this.disk.device,
        photos: sha256 === null ? [] : [sha256],
      };
      const sealed = sealEntry(envelope, this.disk.head, codec);
      this.disk.entries.set(sealed.seq, sealed);
      this.disk.outbox.add(sealed.seq);
      this.disk.head = { seq: sealed.seq, hash: sealed.hash };
      return sealed;
    });
    this.saved.push(entry);
    for (const open of this.pages) open.loop?.wake('saved');
  }

  wakeByHand(): void {
    for (const page of this.pages) page.loop?.wake('by-hand');
  }

  private transact(page: Page): Transact {
    return async (change) => {
      await page.live(this.time.sleep(this.random.between(0, 3)));
      if (this.random.chance(this.storageFaultChance)) throw new StorageFailed('connection lost');
      this.mayDie(page);
      await page.live(Promise.resolve());
      const result = change();
      this.mayDie(page);
      return page.live(Promise.resolve(result));
    };
  }

  private mayDie(page: Page): void {
    if (page.alive && this.random.chance(this.crashChance)) this.kill();
  }

  private deliver(page: Page): DeliveryLoop {
    const serverNow = (): number => 1_790_000_000_000 + this.time.nowMs;
    return startLoop(
      {
        clock: { nowMs: () => serverNow() + this.clockErrorMs, timer: (ms) => page.timer(ms) },
        random: this.random.next,
        codec,
        store: phoneStore(this.disk, this.transact(page), this.watch),
        transport: phoneTransport(this.office, this.network, this.random, serverNow, (sent) =>
          page.live(sent),
        ),
        readReceipt: (receipt) => {
          const claims = JSON.parse(receipt) as Omit<ReceiptReading, 'verified'>;
          return Promise.resolve({ ...claims, verified: true });
        },
        noteFault: (error) => {
          if (!(error instanceof StorageFailed)) throw error;
        },
      },
      (status) => {
        this.lastStatus = status;
        return Promise.resolve();
      },
    );
  }
}

/** One page of the browser. What it waits for never comes once it is dead. */
class Page {
  alive = true;
  loop: DeliveryLoop | null = null;

  constructor(private readonly time: VirtualTime) {}

  live<T>(promise: Promise<T>): Promise<T> {
    return new Promise((resolve, reject) => {
      promise.then(
        (value) => this.alive && resolve(value),
        (error: unknown) => this.alive && reject(error instanceof Error ? error : new Error(String(error))),
      );
    });
  }

  timer(ms: number): ReturnType<VirtualTime['timer']> {
    const timer = this.time.timer(ms);
    return { done: this.live(timer.done), cancel: timer.cancel };
  }
}
