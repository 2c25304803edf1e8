import { Inject, Injectable, Logger } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import type { Role } from '@rimeward/contracts';
import { randomUUID } from 'node:crypto';
import type { EntityManager } from 'typeorm';
import { ProblemException } from '../common/problem.exception';
import { ENVIRONMENT } from '../config/config.module';
import type { Environment } from '../config/environment';
import { CompanyContext } from '../database/company-context';
import { User } from '../users/entities/user.entity';
import { Session } from './entities/session.entity';
import { knownBrowserMark, makeRenewalToken, readRenewalToken } from './renewal-token';

export interface OpenSession {
  session: Session;
  user: User;
  access: string;
  renewal: string;
  known: string;
  accessExpiresAt: Date;
}

const minute = 60_000;
const day = 86_400_000;
const accessMs = 10 * minute;
/** A renewal whose answer was lost may be asked again this long after its successor was used; two tabs race like that. */
const raceMs = minute;

/** Technicians are out for weeks; a desk is left for lunch. */
function limitsOf(role: Role): { idleMs: number; absoluteMs: number } {
  return role === 'technician'
    ? { idleMs: 14 * day, absoluteMs: 30 * day }
    : { idleMs: 60 * minute, absoluteMs: 12 * 60 * minute };
}

/** Opens, renews and ends sessions. The record in the database is the truth; tokens only point at it. */
@Injectable()
export class SessionsService {
  private readonly logger = new Logger('Sessions');

  constructor(
    private readonly context: CompanyContext,
    private readonly jwt: JwtService,
    @Inject(ENVIRONMENT) private readonly environment: Environment,
  ) {}

  async open(user: User): Promise<OpenSession> {
    const now = new Date();
    const { idleMs, absoluteMs } = limitsOf(user.role);
    const session = Object.assign(new Session(), {
      companyId: user.companyId,
      id: randomUUID(),
      userId: user.id,
      generation: 1,
      generationUsed: false,
      rotatedAt: now,
      createdAt: now,
      lastUsedAt: now,
      idleUntil: new Date(now.getTime() + idleMs),
      expiresAt: new Date(now.getTime() + absoluteMs),
      endedAt: null,
      endedBecause: null,
    });
    await this.context.run(user.companyId, (manager) => manager.insert(Session, session));
    return this.tokens(session, user);
  }

  /**
   * The successor of a renewal token. The token before it stays good until the successor has been used, so a lost answer
   * signs nobody out; a token that comes back after that was copied, and ends the session. Tabs that renew at once within a
   * minute get the same successor.
   */
  async renew(token: string): Promise<OpenSession> {
    const claim = readRenewalToken(this.environment.SESSION_JWT_SECRET, token);
    if (!claim) throw new ProblemException('not-signed-in');
    const found = await this.sessionOf(token);
    if (!found) throw new ProblemException('session-ended');
    const renewed = await this.context.run(found.companyId, (manager) =>
      this.rotate(manager, found, claim.generation),
    );
    if (!renewed) throw new ProblemException('session-ended');
    return renewed;
  }

  private async rotate(
    manager: EntityManager,
    found: Session,
    generation: number,
  ): Promise<OpenSession | null> {
    const session = await manager.findOneOrFail(Session, {
      where: { companyId: found.companyId, id: found.id },
      lock: { mode: 'pessimistic_write' },
    });
    const user = await manager.findOneBy(User, { companyId: found.companyId, id: found.userId });
    const now = new Date();
    if (!user || user.disabledAt || !isAlive(session, now)) return null;
    const justRotated = now.getTime() - session.rotatedAt.getTime() < raceMs;
    if (generation === session.generation) {
      if (!justRotated) {
        session.generation += 1;
        session.generationUsed = false;
        session.rotatedAt = now;
      }
    } else {
      const again = generation === session.generation - 1;
      if (!again || (session.generationUsed && !justRotated)) {
        await this.end(manager, session, 'token used twice');
        this.logger.warn(
          { sessionId: session.id, userId: user.id },
          'A renewal token was used twice: the session is ended',
        );
        return null;
      }
    }
    session.lastUsedAt = now;
    session.idleUntil = new Date(now.getTime() + limitsOf(user.role).idleMs);
    await manager.save(session);
    return this.tokens(session, user);
  }

  /** Ends the session of a token of any generation; a token that names none changes nothing. */
  async endByToken(token: string, because: string): Promise<void> {
    const session = await this.sessionOf(token);
    if (!session || session.endedAt) return;
    await this.context.run(session.companyId, (manager) => this.end(manager, session, because));
  }

  private sessionOf(token: string): Promise<Session | null> {
    const claim = readRenewalToken(this.environment.SESSION_JWT_SECRET, token);
    if (!claim) return Promise.resolve(null);
    return this.context.lookUp({ by: 'session', value: claim.sessionId }, (manager) =>
      manager.findOneBy(Session, { id: claim.sessionId }),
    );
  }

  private async end(manager: EntityManager, session: Session, because: string): Promise<void> {
    await manager.update(
      Session,
      { companyId: session.companyId, id: session.id },
      { endedAt: new Date(), endedBecause: because },
    );
  }

  private async tokens(session: Session, user: User): Promise<OpenSession> {
    const secret = this.environment.SESSION_JWT_SECRET;
    const access = await this.jwt.signAsync(
      { sub: user.id, company: user.companyId, sid: session.id, gen: session.generation },
      { expiresIn: accessMs / 1_000 },
    );
    return {
      session,
      user,
      access,
      renewal: makeRenewalToken(secret, { sessionId: session.id, generation: session.generation }),
      known: knownBrowserMark(secret, user.id),
      accessExpiresAt: new Date(Date.now() + accessMs),
    };
  }
}

export function isAlive(session: Session, now: Date): boolean {
  return session.endedAt === null && session.idleUntil > now && session.expiresAt > now;
}
