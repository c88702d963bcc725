import type { RequestHandler } from 'express';
import type { IncomingMessage, ServerResponse } from 'node:http';
import { pinoHttp } from 'pino-http';
import type { Logger } from 'pino';

/** One line per request: method, path, status, time and number. No query, no headers, no body: nothing secret gets in. */
export function accessLog(log: Logger): RequestHandler {
  return pinoHttp<IncomingMessage, ServerResponse>({
    logger: log,
    quietReqLogger: true,
    customLogLevel: (_request, response, error) =>
      error !== undefined || response.statusCode >= 500 ? 'error' : response.statusCode >= 400 ? 'warn' : 'info',
    customProps: (_request, response) => ({ requestId: response.getHeader('x-request-id') }),
    serializers: {
      req: (request: { method: string; url: string }) => ({ method: request.method, path: request.url.split('?')[0] }),
      res: (response: { statusCode: number }) => ({ status: response.statusCode }),
    },
  });
}
