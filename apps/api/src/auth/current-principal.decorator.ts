import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';
import type { Principal } from './principal';

/** The person of the session, on routes that need one. */
export const CurrentPrincipal = createParamDecorator((_: unknown, context: ExecutionContext): Principal => {
  const principal = (context.switchToHttp().getRequest<Request>() as Request & { user?: Principal }).user;
  if (!principal) throw new Error('The route has no session guard');
  return principal;
});
