import type { NestExpressApplication } from '@nestjs/platform-express';
import type { NextFunction, Request, Response } from 'express';
import type { IncomingMessage } from 'node:http';
import { toProblemException } from './to-problem-exception';

const PLAN_LIMIT = '6mb';
const LIMIT = '256kb';
const PLANS = /^\/api\/plans(\/|\?|$)/;

/** JSON bodies only; a plan may be large, anything else may not. */
export function useBodyParsers(app: NestExpressApplication): void {
  app.useBodyParser('json', {
    limit: PLAN_LIMIT,
    type: (request) => isJson(request) && isPlan(request),
  });
  app.useBodyParser('json', {
    limit: LIMIT,
    type: (request) => isJson(request) && !isPlan(request),
  });
  // Nest would turn a parser's error into its own before the filter sees it.
  app.use((error: unknown, _request: Request, _response: Response, next: NextFunction) => {
    next(toProblemException(error));
  });
}

function isJson({ headers }: IncomingMessage): boolean {
  return /^application\/json\s*(;|$)/i.test(headers['content-type'] ?? '');
}

function isPlan(request: IncomingMessage & { originalUrl?: string }): boolean {
  return PLANS.test(request.originalUrl ?? request.url ?? '');
}
