import { NotFoundError, UniqueConstraintViolationException } from '@mikro-orm/core';
import { HttpException } from '@nestjs/common';
import { ThrottlerException } from '@nestjs/throttler';
import { TimeoutError } from 'rxjs';
import { ProblemException } from './problem.exception';

/** Errors of Express's body parsers, by their `type`. */
const BODY_ERRORS: Record<string, 'malformedJson' | 'tooLarge'> = {
  'entity.parse.failed': 'malformedJson',
  'entity.too.large': 'tooLarge',
  'encoding.unsupported': 'malformedJson',
  'charset.unsupported': 'malformedJson',
  'request.size.invalid': 'malformedJson',
  'request.aborted': 'malformedJson',
};

const BY_STATUS: Record<
  number,
  'validation' | 'notSignedIn' | 'notAllowed' | 'notFound' | 'tooLarge'
> = {
  400: 'validation',
  401: 'notSignedIn',
  403: 'notAllowed',
  404: 'notFound',
  413: 'tooLarge',
};

/** Turns whatever was thrown into a problem; what nobody foresaw becomes `internal`. */
export function toProblemException(error: unknown): ProblemException {
  if (error instanceof ProblemException) return error;
  if (error instanceof NotFoundError) return new ProblemException('notFound');
  if (error instanceof UniqueConstraintViolationException) return new ProblemException('conflict');
  if (error instanceof TimeoutError) return new ProblemException('timeout');
  if (error instanceof ThrottlerException) return new ProblemException('tooManyRequests');
  if (error instanceof HttpException) {
    return new ProblemException(BY_STATUS[error.getStatus()] ?? 'internal');
  }
  if (error instanceof URIError) return new ProblemException('notFound');
  const bodyError = BODY_ERRORS[String((error as { type?: unknown } | null)?.type)];
  return new ProblemException(bodyError ?? 'internal');
}
