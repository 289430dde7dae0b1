import { randomUUID } from 'node:crypto';
import type { NextFunction, Request, Response } from 'express';

/** Names every request, so that an answer and the log can be brought together. First of all middleware. */
export function requestId(request: Request, response: Response, next: NextFunction): void {
  request.id = randomUUID();
  response.setHeader('X-Request-Id', request.id);
  next();
}
