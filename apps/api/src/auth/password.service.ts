import { Injectable } from '@nestjs/common';
import { hash, verify } from '@node-rs/argon2';
import { ProblemException } from '../common/problem.exception';

/** argon2id as OWASP's password storage sheet has it: 19 MiB, two passes, one lane. */
const parameters = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

/** Hashes in flight at once; the rest wait, and past the queue they are told to come again. */
const lanes = 4;
const longestQueue = 60;

@Injectable()
export class PasswordService {
  private busy = 0;
  private readonly waiting: (() => void)[] = [];
  /** Checked against when nobody has this e-mail, so that the answer takes as long. */
  private readonly nobody = hash('nobody has this password', parameters);

  hash(password: string): Promise<string> {
    return this.inLane(() => hash(exact(password), parameters));
  }

  async matches(passwordHash: string | null, password: string): Promise<boolean> {
    const known = passwordHash ?? (await this.nobody);
    const right = await this.inLane(() => verify(known, exact(password)));
    return right && passwordHash !== null;
  }

  private async inLane<T>(work: () => Promise<T>): Promise<T> {
    await this.enterLane();
    try {
      return await work();
    } finally {
      const next = this.waiting.shift();
      // The lane goes over to whoever waits; it is never free for somebody else in between.
      if (next) next();
      else this.busy -= 1;
    }
  }

  private async enterLane(): Promise<void> {
    if (this.busy < lanes) {
      this.busy += 1;
      return;
    }
    if (this.waiting.length >= longestQueue)
      throw new ProblemException('too-many-requests', { retryAfterSeconds: 2 });
    await new Promise<void>((resolve) => this.waiting.push(resolve));
  }
}

/** One spelling for letters that keyboards write in two ways (NFC, as NIST SP 800-63B asks for). */
function exact(password: string): string {
  return password.normalize('NFC');
}
