import { Injectable, Logger } from '@nestjs/common';

interface Count {
  failures: number;
  since: number;
}

const windowMs = 10 * 60_000;
const perAccount = 10;
const perAddress = 60;
/** One password tried on many accounts from many addresses: past this, only known browsers get in. */
const altogether = 600;
const mostKeys = 50_000;

export interface Attempt {
  account: string;
  address: string;
  /** A browser in which this person has signed in before is not blocked by what strangers do to the account. */
  knownBrowser: boolean;
}

/**
 * Counts sign-ins that have not succeeded per account, per address and altogether; a full window blocks until it has passed. An
 * attempt counts from its start, so that many at once do not slip through. Kept in memory.
 */
@Injectable()
export class SignInAttempts {
  private readonly logger = new Logger('SignIn');
  private readonly counts = new Map<string, Count>();

  /** Seconds until another attempt is allowed; 0 when it is allowed now, and then it counts. */
  begin(attempt: Attempt): number {
    const limits = limitsOf(attempt);
    const waitMs = Math.max(0, ...limits.map(({ key, most }) => this.left(key, most)));
    if (waitMs > 0) {
      this.logger.warn('A sign-in was not tried: too many have failed');
      return Math.ceil(waitMs / 1_000);
    }
    for (const { key } of limits) this.add(key);
    return 0;
  }

  /** The attempt was right: it does not count, and the account starts afresh. */
  succeeded(attempt: Attempt): void {
    this.counts.delete(`account ${attempt.account}`);
    for (const { key } of limitsOf(attempt)) this.takeBack(key);
  }

  private add(key: string): void {
    const count = this.current(key);
    if (count) count.failures += 1;
    else this.counts.set(key, { failures: 1, since: Date.now() });
    if (this.counts.size > mostKeys) this.dropOldest();
  }

  private takeBack(key: string): void {
    const count = this.current(key);
    if (count) count.failures -= 1;
  }

  private current(key: string): Count | null {
    const count = this.counts.get(key);
    if (!count) return null;
    if (Date.now() - count.since < windowMs) return count;
    this.counts.delete(key);
    return null;
  }

  private left(key: string, most: number): number {
    const count = this.current(key);
    return count && count.failures >= most ? count.since + windowMs - Date.now() : 0;
  }

  private dropOldest(): void {
    for (const key of this.counts.keys()) {
      this.counts.delete(key);
      return;
    }
  }
}

function limitsOf({ account, address, knownBrowser }: Attempt): { key: string; most: number }[] {
  const byAddress = { key: `address ${address}`, most: perAddress };
  if (knownBrowser) return [byAddress];
  return [
    byAddress,
    { key: `account ${account}`, most: perAccount },
    { key: 'altogether', most: altogether },
  ];
}
