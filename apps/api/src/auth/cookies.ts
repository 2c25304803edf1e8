import { Inject, Injectable } from '@nestjs/common';
import type { CookieOptions, Request, Response } from 'express';
import { ENVIRONMENT } from '../config/config.module';
import type { Environment } from '../config/environment';

/** Both tokens live in HttpOnly cookies that no script can read; `__Host-` ties them to this very host over TLS. */
@Injectable()
export class SessionCookies {
  private readonly prefix: string;
  private readonly options: CookieOptions;

  constructor(@Inject(ENVIRONMENT) environment: Environment) {
    const secure = environment.COOKIE_SECURE === 'true';
    this.prefix = secure ? '__Host-' : '';
    this.options = { httpOnly: true, secure, sameSite: 'strict', path: '/' };
  }

  put(response: Response, tokens: { access: string; renewal: string; endsAt: Date; known: string }): void {
    response.cookie(`${this.prefix}rw_access`, tokens.access, { ...this.options, expires: tokens.endsAt });
    response.cookie(`${this.prefix}rw_session`, tokens.renewal, { ...this.options, expires: tokens.endsAt });
    const year = new Date(Date.now() + 365 * 86_400_000);
    response.cookie(`${this.prefix}rw_known`, tokens.known, { ...this.options, expires: year });
  }

  clear(response: Response): void {
    response.clearCookie(`${this.prefix}rw_access`, this.options);
    response.clearCookie(`${this.prefix}rw_session`, this.options);
  }

  access(request: Request): string | null {
    return this.read(request, 'rw_access');
  }

  renewal(request: Request): string | null {
    return this.read(request, 'rw_session');
  }

  /** Marks a browser in which this person has signed in before; it opens nothing, it only spares him the lock. */
  known(request: Request): string | null {
    return this.read(request, 'rw_known');
  }

  private read(request: Request, name: string): string | null {
    const value = (request.cookies as Record<string, unknown> | undefined)?.[`${this.prefix}${name}`];
    return typeof value === 'string' && value.length <= 2_000 ? value : null;
  }
}
