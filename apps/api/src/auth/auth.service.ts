import { Inject, Injectable, Logger } from '@nestjs/common';
import type { Session as SessionAnswer, SignInRequest } from '@rimeward/contracts';
import { ProblemException } from '../common/problem.exception';
import { Company } from '../companies/entities/company.entity';
import { ENVIRONMENT } from '../config/config.module';
import type { Environment } from '../config/environment';
import { CompanyContext } from '../database/company-context';
import { User } from '../users/entities/user.entity';
import { SignInAttempts } from './attempts';
import { Session } from './entities/session.entity';
import { PasswordService } from './password.service';
import type { Principal } from './principal';
import { knownBrowserMark } from './renewal-token';
import { SessionsService, type OpenSession } from './sessions.service';

@Injectable()
export class AuthService {
  private readonly logger = new Logger('SignIn');

  constructor(
    private readonly context: CompanyContext,
    private readonly passwords: PasswordService,
    private readonly attempts: SignInAttempts,
    private readonly sessions: SessionsService,
    @Inject(ENVIRONMENT) private readonly environment: Environment,
  ) {}

  /** The same answer, in the same time, whether the e-mail is unknown or the password wrong. */
  async signIn(
    request: SignInRequest,
    from: { address: string; known: string | null },
  ): Promise<OpenSession> {
    const email = request.email.trim().toLowerCase();
    const users = await this.context.lookUp({ by: 'sign_in_email', value: email }, (manager) =>
      manager.findBy(User, { email }),
    );
    const enabled = users.filter((user) => user.disabledAt === null);
    const knownBrowser = enabled.some(
      (user) => from.known === knownBrowserMark(this.environment.SESSION_JWT_SECRET, user.id),
    );
    const attempt = { account: email, address: from.address, knownBrowser };
    const wait = this.attempts.begin(attempt);
    if (wait > 0) throw new ProblemException('too-many-attempts', { retryAfterSeconds: wait });
    for (const user of enabled.length > 0 ? enabled : [null]) {
      if (!(await this.passwords.matches(user?.passwordHash ?? null, request.password)) || !user) continue;
      this.attempts.succeeded(attempt);
      return this.sessions.open(user);
    }
    this.logger.warn('A sign-in failed');
    throw new ProblemException('sign-in-failed');
  }

  async answer(
    principal: Pick<Principal, 'companyId' | 'userId' | 'sessionId'>,
    accessExpiresAt: Date,
  ): Promise<SessionAnswer> {
    const { companyId, userId, sessionId } = principal;
    return this.context.run(companyId, async (manager) => {
      const user = await manager.findOneByOrFail(User, { companyId, id: userId });
      const company = await manager.findOneByOrFail(Company, { id: companyId });
      const session = await manager.findOneByOrFail(Session, { companyId, id: sessionId });
      const { id, name, email, role, language, blowOutSignedOff } = user;
      return {
        user: { id, name, email, role, language, blowOutSignedOff },
        company: { id: company.id, name: company.name, settings: company.settings },
        accessExpiresAt: accessExpiresAt.toISOString(),
        sessionExpiresAt: session.expiresAt.toISOString(),
        serverTime: new Date().toISOString(),
      };
    });
  }
}
