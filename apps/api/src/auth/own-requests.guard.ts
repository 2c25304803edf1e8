import { Inject, Injectable, type CanActivate, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';
import { ProblemException } from '../common/problem.exception';
import { ENVIRONMENT } from '../config/config.module';
import type { Environment } from '../config/environment';

const safe = new Set(['GET', 'HEAD', 'OPTIONS']);
const loopback = new Set(['localhost', '127.0.0.1', '[::1]']);

/**
 * Requests that change something come from our own pages or from a device: own header, own origin, JSON or parts of a
 * photograph. Keeps other sites from using a person's cookies.
 */
@Injectable()
export class OwnRequestsGuard implements CanActivate {
  constructor(@Inject(ENVIRONMENT) private readonly environment: Environment) {}

  canActivate(context: ExecutionContext): boolean {
    const request = context.switchToHttp().getRequest<Request>();
    if (safe.has(request.method)) return true;
    const origin = request.headers.origin;
    if (origin !== undefined && !this.isOwn(origin)) throw new ProblemException('foreign-origin');
    const type = request.headers['content-type'] ?? '';
    const hasBody =
      request.headers['content-length'] !== '0' &&
      (request.headers['content-length'] !== undefined || request.headers['transfer-encoding'] !== undefined);
    if (hasBody && !/^(application\/json|multipart\/form-data)\b/i.test(type))
      throw new ProblemException('wrong-media-type');
    if (request.headers.authorization?.startsWith('Device ')) return true;
    if (request.headers['x-rimeward-request'] !== '1') throw new ProblemException('foreign-origin');
    return true;
  }

  private isOwn(origin: string): boolean {
    if (origin === this.environment.PUBLIC_ORIGIN) return true;
    if (!URL.canParse(origin)) return false;
    const [own, other] = [new URL(this.environment.PUBLIC_ORIGIN), new URL(origin)];
    return loopback.has(own.hostname) && loopback.has(other.hostname) && own.port === other.port;
  }
}
