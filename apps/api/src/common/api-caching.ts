import type { NextFunction, Request, Response } from 'express';

/** Answers of the API belong to one person and may change: browsers ask again, by ETag, before they use one twice. */
export function apiCaching(_request: Request, response: Response, next: NextFunction): void {
  response.setHeader('Cache-Control', 'private, no-cache');
  next();
}
