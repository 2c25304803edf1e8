import type { Sent } from '@rimeward/delivery';
import type { Seeded } from './random';
import type { VirtualTime } from './virtual-time';
import { ServerDied } from './office/office';

const faults = [
  'request lost',
  'answer lost',
  'delivered twice',
  'delivered again later',
  'half-open',
  'captive portal',
  'answer cut',
  'busy',
  'server fault',
  'proxy fault',
  'late answer',
] as const;

/** What lies between a phone and the office. With `faultChance` 0 it is only slow. */
export class Network {
  faultChance = 0;
  /** Nothing passes before this moment. */
  downUntilMs = 0;

  constructor(
    private readonly time: VirtualTime,
    private readonly random: Seeded,
  ) {}

  /** Carries a request to `deliver`, which may be called never, once or more than once. */
  async carry(limitMs: number, deliver: () => Promise<unknown>): Promise<Sent> {
    await this.time.sleep(this.random.between(5, 120));
    if (this.time.nowMs < this.downUntilMs) return { arrived: false, why: 'no-network' };
    if (!this.random.chance(this.faultChance)) return this.answer(deliver);
    switch (this.random.pick(faults)) {
      case 'request lost':
        return this.silence(limitMs);
      case 'answer lost':
        await this.answer(deliver);
        return this.silence(limitMs);
      case 'delivered twice': {
        const [first] = await Promise.all([this.answer(deliver), this.answer(deliver)]);
        return first;
      }
      case 'delivered again later':
        void this.time.sleep(this.random.between(100, 90_000)).then(() => this.answer(deliver));
        return this.answer(deliver);
      case 'half-open':
        await this.answer(deliver);
        return new Promise(() => undefined);
      case 'captive portal':
        return page(200, '<html>please sign in to the hotel</html>');
      case 'answer cut':
        return cut(await this.answer(deliver), this.random);
      case 'busy':
        return {
          arrived: true,
          answer: {
            status: this.random.pick([429, 503]),
            contentType: 'application/json',
            retryAfter: String(this.random.whole(1, 20)),
            text: '{}',
          },
        };
      case 'server fault':
        return {
          arrived: true,
          answer: {
            status: 500,
            contentType: 'application/problem+json',
            retryAfter: null,
            text: '{"code":"internal"}',
          },
        };
      case 'proxy fault':
        return page(502, '<html>bad gateway</html>');
      case 'late answer': {
        const sent = await this.answer(deliver);
        await this.time.sleep(this.random.between(1_000, 2 * limitMs));
        return sent;
      }
    }
  }

  private async answer(deliver: () => Promise<unknown>): Promise<Sent> {
    try {
      const body = await deliver();
      await this.time.sleep(this.random.between(5, 120));
      if (body === null) return problem(409, 'photo-hash-mismatch');
      const text = JSON.stringify(body);
      return {
        arrived: true,
        answer: { status: 200, contentType: 'application/json', retryAfter: null, text },
      };
    } catch (error) {
      if (error instanceof ServerDied) return { arrived: false, why: 'no-network' };
      throw error;
    }
  }

  private async silence(limitMs: number): Promise<Sent> {
    await this.time.sleep(limitMs);
    return { arrived: false, why: 'timeout' };
  }
}

function page(status: number, text: string): Sent {
  return {
    arrived: true,
    answer: { status, contentType: 'text/html; charset=utf-8', retryAfter: null, text },
  };
}

function problem(status: number, code: string): Sent {
  const text = JSON.stringify({ code });
  return {
    arrived: true,
    answer: { status, contentType: 'application/problem+json', retryAfter: null, text },
  };
}

function cut(sent: Sent, random: Seeded): Sent {
  if (!sent.arrived) return sent;
  const { answer } = sent;
  return {
    arrived: true,
    answer: { ...answer, text: answer.text.slice(0, random.whole(0, answer.text.length - 1)) },
  };
}
