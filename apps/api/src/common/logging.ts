import { randomUUID } from 'node:crypto';
import { RequestMethod } from '@nestjs/common';
import type { Request, Response } from 'express';
import type { Params } from 'nestjs-pino';

/**
 * One line of JSON a request. Nothing about a person goes in: no header, body, query or network address; ids of
 * rows may.
 */
export function loggerOptions(level: string): Params {
  return {
    pinoHttp: {
      level,
      genReqId: (_request, response) => {
        const id = randomUUID();
        response.setHeader('X-Request-Id', id);
        return id;
      },
      customLogLevel: (_request, response, error) =>
        error || response.statusCode >= 500 ? 'error' : 'info',
      serializers: {
        req: (request: Request) => ({
          id: request.id,
          method: request.method,
          path: String(request.url).split('?')[0],
        }),
        res: (response: Response) => ({ status: response.statusCode }),
      },
    },
    forRoutes: [{ path: '{*rest}', method: RequestMethod.ALL }],
  };
}
