import { Injectable, type ExecutionContext } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { AuthGuard } from '@nestjs/passport';
import { ProblemException } from '../common/problem.exception';
import { ACCESS, type Access } from './access.decorators';
import type { Principal } from './principal';

/** Stands before every route. A route that does not say who may call it is closed to everybody. */
@Injectable()
export class SessionGuard extends AuthGuard('access') {
  constructor(private readonly reflector: Reflector) {
    super();
  }

  override async canActivate(context: ExecutionContext): Promise<boolean> {
    const access = this.reflector.getAllAndOverride<Access | undefined>(ACCESS, [
      context.getHandler(),
      context.getClass(),
    ]);
    if (!access) throw new Error('This route does not say who may call it');
    if (access.kind !== 'roles') return true;
    await super.canActivate(context);
    const principal = context.switchToHttp().getRequest<{ user: Principal }>().user;
    if (!access.roles.includes(principal.role)) throw new ProblemException('not-allowed');
    return true;
  }

  override handleRequest<T>(error: unknown, user: T | false): T {
    if (error instanceof Error) throw error;
    if (error) throw new Error('The session could not be read', { cause: error });
    if (!user) throw new ProblemException('not-signed-in');
    return user;
  }
}
