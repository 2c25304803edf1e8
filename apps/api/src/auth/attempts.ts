import { Injectable } from '@nestjs/common';

interface Count {
  failures: number;
  since: number;
}

const windowMs = 10 * 60_000;
const perAccount = 10;
const perAddress = 60;
const mostKeys = 50_000;

/** Counts failed sign-ins per account and per address; a full window blocks until it has passed. Kept in memory. */
@Injectable()
export class SignInAttempts {
  private readonly counts = new Map<string, Count>();

  /** Seconds until another attempt is allowed; 0 when it is allowed now. A known browser is not blocked by account. */
  waitSeconds(account: string, address: string, knownBrowser: boolean): number {
    const byAddress = this.left(`address ${address}`, perAddress);
    const byAccount = knownBrowser ? 0 : this.left(`account ${account}`, perAccount);
    return Math.ceil(Math.max(byAddress, byAccount) / 1_000);
  }

  failed(account: string, address: string): void {
    for (const key of [`account ${account}`, `address ${address}`]) {
      const count = this.current(key);
      this.counts.set(
        key,
        count ? { ...count, failures: count.failures + 1 } : { failures: 1, since: Date.now() },
      );
    }
    if (this.counts.size > mostKeys) this.counts.delete(this.counts.keys().next().value ?? '');
  }

  succeeded(account: string): void {
    this.counts.delete(`account ${account}`);
  }

  private current(key: string): Count | null {
    const count = this.counts.get(key);
    return count && Date.now() - count.since < windowMs ? count : null;
  }

  private left(key: string, most: number): number {
    const count = this.current(key);
    return count && count.failures >= most ? count.since + windowMs - Date.now() : 0;
  }
}
