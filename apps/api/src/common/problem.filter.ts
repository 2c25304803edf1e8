import { Catch, HttpException, Logger, type ArgumentsHost, type ExceptionFilter } from '@nestjs/common';
import type { ProblemCode } from '@rimeward/contracts';
import type { Response } from 'express';
import { ProblemException } from './problem.exception';

const codeOfStatus: Record<number, ProblemCode> = {
  400: 'bad-request',
  401: 'not-signed-in',
  403: 'not-allowed',
  404: 'not-found',
  405: 'not-found',
  409: 'conflict',
  413: 'payload-too-large',
  415: 'wrong-media-type',
  429: 'too-many-requests',
  503: 'unavailable',
};

/** Turns whatever was thrown into problem details. Texts of the database and of libraries stay in our own log. */
@Catch()
export class ProblemFilter implements ExceptionFilter {
  private readonly logger = new Logger('Problem');

  catch(thrown: unknown, host: ArgumentsHost): void {
    const response = host.switchToHttp().getResponse<Response>();
    const problem = this.problemOf(thrown);
    if (response.headersSent) {
      response.destroy();
      return;
    }
    const details = problem.details();
    if (details.retryAfterSeconds !== undefined)
      response.setHeader('Retry-After', String(details.retryAfterSeconds));
    response.setHeader('Cache-Control', 'no-store');
    response.status(details.status).type('application/problem+json').send(JSON.stringify(details));
  }

  private problemOf(thrown: unknown): ProblemException {
    if (thrown instanceof ProblemException) return thrown;
    if (thrown instanceof HttpException)
      return new ProblemException(codeOfStatus[thrown.getStatus()] ?? 'internal');
    const status = statusOf(thrown);
    if (status !== null) return new ProblemException(codeOfStatus[status] ?? 'bad-request');
    this.logger.error(thrown instanceof Error ? (thrown.stack ?? thrown.message) : String(thrown));
    return new ProblemException(codeOfFault(thrown));
  }
}

/** Errors of the body parser carry a status of their own. */
function statusOf(thrown: unknown): number | null {
  const status = (thrown as { status?: unknown; expose?: unknown } | null)?.status;
  return typeof status === 'number' && status >= 400 && status < 500 ? status : null;
}

/** The pool and the driver name these faults by their text alone. */
const lostConnection =
  /Connection terminated|timeout exceeded when trying to connect|Client has encountered a connection error/;

/** Codes of PostgreSQL (08, 53, 57P, 3D: no connection; 22: a value that it cannot hold) and of the network. */
function codeOfFault(thrown: unknown): ProblemCode {
  const { code, message } = (thrown ?? {}) as { code?: unknown; message?: unknown };
  if (typeof message === 'string' && lostConnection.test(message)) return 'unavailable';
  if (typeof code !== 'string') return 'internal';
  if (/^(ECONN|EPIPE|ETIMEDOUT|ENOTFOUND)/.test(code) || /^(08|53|57P|3D)/.test(code)) return 'unavailable';
  return /^22[0-9A-Z]{3}$/.test(code) ? 'bad-request' : 'internal';
}
