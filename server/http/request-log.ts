import { randomUUID } from 'node:crypto';
import type { RequestHandler } from 'express';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';

/** One line for each request: no header, no body, no cookie. */
export function requestLog(log: Logger): RequestHandler {
  return pinoHttp({
    logger: log,
    quietReqLogger: true,
    genReqId: () => randomUUID(),
    serializers: {
      req: (request: { id: string; method: string; url: string }) => ({
        id: request.id,
        method: request.method,
        url: request.url,
      }),
      res: (response: { statusCode: number }) => ({ status: response.statusCode }),
    },
    customLogLevel: (request, response) => {
      if (response.statusCode >= 500) return 'error';
      return request.url?.startsWith('/api/health') ? 'debug' : 'info';
    },
  });
}
