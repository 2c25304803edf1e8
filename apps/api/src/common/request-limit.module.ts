import { Injectable, Module, type ExecutionContext } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { ThrottlerGuard, ThrottlerModule, type ThrottlerLimitDetail } from '@nestjs/throttler';
import { ENVIRONMENT } from '../config/config.module';
import type { Environment } from '../config/environment';
import { ProblemException } from './problem.exception';

const windowMs = 10_000;
const pauseMs = 5_000;
/** An office is one address and many people. */
const askersAtOneAddress = 10;

/** Answers 429 to whoever asks too fast, so that the others keep their share. */
@Injectable()
class RequestLimitGuard extends ThrottlerGuard {
  protected override throwThrottlingException(
    _context: ExecutionContext,
    { timeToBlockExpire }: ThrottlerLimitDetail,
  ): Promise<void> {
    return Promise.reject(
      new ProblemException('too-many-requests', { retryAfterSeconds: Math.max(1, timeToBlockExpire) }),
    );
  }
}

@Module({
  imports: [
    ThrottlerModule.forRootAsync({
      inject: [ENVIRONMENT],
      useFactory: ({ REQUEST_LIMIT: limit }: Environment) => {
        const common = {
          ttl: windowMs,
          blockDuration: pauseMs,
          // One count for all routes together.
          generateKey: (_: ExecutionContext, tracker: string, name: string) => `${name} ${tracker}`,
        };
        return {
          setHeaders: false,
          throttlers: [
            { ...common, name: 'asker', limit, getTracker: askerOf },
            { ...common, name: 'address', limit: limit * askersAtOneAddress, getTracker: addressOf },
          ],
        };
      },
    }),
  ],
  providers: [{ provide: APP_GUARD, useClass: RequestLimitGuard }],
})
export class RequestLimitModule {}

/** A person or a phone at an address; with the address, so that nobody uses up another one's share by naming him. */
function askerOf({ ip, headers }: Record<string, unknown>): string {
  const { authorization = '', cookie = '' } = headers as Record<string, string | undefined>;
  return `${String(ip)} ${authorization} ${/rw_session=[^;]+/.exec(cookie)?.[0] ?? ''}`;
}

function addressOf({ ip }: Record<string, unknown>): string {
  return String(ip);
}
