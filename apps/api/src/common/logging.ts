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
      genReqId: ({ id }) => id,
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
