import { Controller, Get, Header, HttpCode, Post, Req, Res } from '@nestjs/common';
import { signInRequestSchema, type Session, type SignInRequest } from '@rimeward/contracts';
import type { Request, Response } from 'express';
import { ProblemException } from '../common/problem.exception';
import { ZodBody } from '../common/zod-body';
import { Public, SignedIn } from './access.decorators';
import { AuthService } from './auth.service';
import { SessionCookies } from './cookies';
import { CurrentPrincipal } from './current-principal.decorator';
import type { Principal } from './principal';
import { SessionsService, type OpenSession } from './sessions.service';

/** Sign-in, renewal, sign-out. Tokens travel in cookies only. */
@Controller('auth')
export class AuthController {
  constructor(
    private readonly auth: AuthService,
    private readonly sessions: SessionsService,
    private readonly cookies: SessionCookies,
  ) {}

  @Public()
  @Post('sign-in')
  @HttpCode(200)
  @Header('Cache-Control', 'no-store')
  async signIn(
    @ZodBody(signInRequestSchema) request: SignInRequest,
    @Req() http: Request,
    @Res({ passthrough: true }) response: Response,
  ): Promise<Session> {
    const from = { address: http.ip ?? 'unknown', known: this.cookies.known(http) };
    return this.hand(response, await this.auth.signIn(request, from));
  }

  @Public()
  @Post('renew')
  @HttpCode(200)
  @Header('Cache-Control', 'no-store')
  async renew(@Req() http: Request, @Res({ passthrough: true }) response: Response): Promise<Session> {
    const token = this.cookies.renewal(http);
    if (!token) throw new ProblemException('not-signed-in');
    return this.hand(response, await this.sessions.renew(token));
  }

  /** Works with a session that has expired or ended, too: the cookies go whatever they say. */
  @Public()
  @Post('sign-out')
  @HttpCode(204)
  async signOut(@Req() http: Request, @Res({ passthrough: true }) response: Response): Promise<void> {
    const token = this.cookies.renewal(http);
    if (token) await this.sessions.endByToken(token, 'signed out');
    this.cookies.clear(response);
  }

  @SignedIn()
  @Get('session')
  @Header('Cache-Control', 'no-store')
  session(@CurrentPrincipal() person: Principal): Promise<Session> {
    return this.auth.answer(person, person.accessExpiresAt);
  }

  private hand(response: Response, open: OpenSession): Promise<Session> {
    const { session, user, access, renewal, known, accessExpiresAt } = open;
    this.cookies.put(response, { access, renewal, known, endsAt: session.expiresAt });
    return this.auth.answer(
      { companyId: user.companyId, userId: user.id, sessionId: session.id },
      accessExpiresAt,
    );
  }
}
