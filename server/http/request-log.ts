import { randomUUID } from 'node:crypto';

import type { IncomingMessage, ServerResponse } from 'node:http';
import type { RequestHandler } from 'express';
import type { Logger } from 'pino';
import { pinoHttp } from 'pino-http';

/**
 * Logs each request by number, method, path, status and time. No address of the caller, no headers, no query (a search
 * is somebody's name) and no body ever reach the log.
 */
export function requestLog(log: Logger): RequestHandler {
  return pinoHttp<IncomingMessage & { id: string }, ServerResponse>({
    logger: log,
    genReqId: () => randomUUID(),
    serializers: {
      req: (req: { id: string; method: string; url: string }) => ({
        id: req.id,
        method: req.method,
        path: req.url.split('?', 1)[0],
      }),
      res: (res: { statusCode: number }) => ({ status: res.statusCode }),
    },
    customLogLevel: (_req, res, error) => (error || res.statusCode >= 500 ? 'error' : 'info'),
    quietReqLogger: true,
  }) as unknown as RequestHandler;
}
