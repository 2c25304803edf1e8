import { Inject, Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import type { Request } from 'express';
import { Strategy } from 'passport-jwt';
import { z } from 'zod';
import { ENVIRONMENT } from '../config/config.module';
import type { Environment } from '../config/environment';
import { CompanyContext } from '../database/company-context';
import { User } from '../users/entities/user.entity';
import { SessionCookies } from './cookies';
import { Session } from './entities/session.entity';
import type { Principal } from './principal';
import { isAlive } from './sessions.service';

const claimsSchema = z.object({
  sub: z.uuid(),
  company: z.uuid(),
  sid: z.uuid(),
  gen: z.number().int(),
  exp: z.number(),
});

/** Reads the access cookie, then asks the database whether that session still stands and who its person is today. */
@Injectable()
export class AccessStrategy extends PassportStrategy(Strategy, 'access') {
  constructor(
    @Inject(ENVIRONMENT) environment: Environment,
    cookies: SessionCookies,
    private readonly context: CompanyContext,
  ) {
    super({
      jwtFromRequest: (request: Request) => cookies.access(request),
      secretOrKey: environment.SESSION_JWT_SECRET,
      algorithms: ['HS256'],
    });
  }

  async validate(payload: unknown): Promise<Principal | false> {
    const claims = claimsSchema.safeParse(payload);
    if (!claims.success) return false;
    const { sub, company, sid, gen, exp } = claims.data;
    return this.context.run(company, async (manager) => {
      const session = await manager.findOneBy(Session, { companyId: company, id: sid });
      const user = await manager.findOneBy(User, { companyId: company, id: sub });
      if (!session || !user || user.disabledAt || session.userId !== user.id || !isAlive(session, new Date()))
        return false;
      if (gen === session.generation && !session.generationUsed) {
        await manager.update(Session, { companyId: company, id: sid }, { generationUsed: true });
      }
      return {
        companyId: company,
        userId: user.id,
        name: user.name,
        role: user.role,
        sessionId: sid,
        accessExpiresAt: new Date(exp * 1_000),
      };
    });
  }
}
