import type { NestExpressApplication } from '@nestjs/platform-express';
import type { IncomingMessage } from 'node:http';

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
}

function isJson({ headers }: IncomingMessage): boolean {
  return /^application\/json\s*(;|$)/i.test(headers['content-type'] ?? '');
}

function isPlan(request: IncomingMessage & { originalUrl?: string }): boolean {
  return PLANS.test(request.originalUrl ?? request.url ?? '');
}
