import {
  Catch,
  Logger,
  NotFoundException,
  type ArgumentsHost,
  type ExceptionFilter,
} from '@nestjs/common';
import type { Problem } from '@lampwright/contracts';
import type { Request, Response } from 'express';
import { allowedMethods } from './allowed-methods';
import { PROBLEMS } from './messages';
import { ProblemException } from './problem.exception';
import { toProblemException } from './to-problem-exception';

/** Answers every error of the API in the one shape, `application/problem+json`; stacks go to the log alone. */
@Catch()
export class ProblemFilter implements ExceptionFilter {
  private readonly logger = new Logger('Problem');

  catch(error: unknown, host: ArgumentsHost): void {
    const http = host.switchToHttp();
    const request = http.getRequest<Request & { id?: unknown }>();
    const response = http.getResponse<Response>();
    if (response.headersSent) {
      response.end();
      return;
    }
    const exception = refine(toProblemException(error), error, request, response);
    const problem = describe(exception, request.id);
    if (problem.status >= 500) {
      this.logger.error(error instanceof Error ? (error.stack ?? error.message) : String(error));
    }
    if (problem.retryAfter !== undefined) {
      response.setHeader('Retry-After', String(problem.retryAfter));
    }
    response
      .status(problem.status)
      .setHeader('Cache-Control', 'no-store')
      .type('application/problem+json')
      .send(JSON.stringify(problem));
  }
}

/** An address that exists under another method is a 405; a throttled request says how long to wait. */
function refine(
  exception: ProblemException,
  error: unknown,
  request: Request,
  response: Response,
): ProblemException {
  // Nest's own exception, not ours: no route has answered.
  if (error instanceof NotFoundException) {
    const allowed = allowedMethods(request);
    if (allowed.length === 0 || allowed.includes(request.method)) return exception;
    response.setHeader('Allow', allowed.join(', '));
    return new ProblemException('methodNotAllowed');
  }
  if (exception.reason === 'tooManyRequests' && exception.extras.retryAfter === undefined) {
    const seconds = Number(response.getHeader('Retry-After') ?? 60);
    return new ProblemException('tooManyRequests', { retryAfter: seconds });
  }
  return exception;
}

function describe({ reason, extras }: ProblemException, requestId: unknown): Problem {
  const { status, title, detail } = PROBLEMS[reason];
  return {
    type: `urn:lampwright:problem:${reason}`,
    title,
    status,
    detail: extras.detail ?? detail,
    reason,
    ...(extras.errors && { errors: extras.errors }),
    ...(extras.retryAfter !== undefined && { retryAfter: extras.retryAfter }),
    ...(typeof requestId === 'string' && { requestId }),
  };
}
