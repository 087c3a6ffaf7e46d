import { randomUUID } from 'node:crypto';
import { pino, type Logger } from 'pino';
import { pinoHttp } from 'pino-http';
import type { Env } from '#server/env.ts';

/**
 * Only these of an error: what the database's errors carry besides (statements, values, details) may hold what
 * users typed, hashes included.
 */
export function errorForLog(error: unknown): object {
  if (!(error instanceof Error)) return { message: String(error) };
  const code = 'code' in error ? error.code : undefined;
  return { type: error.name, message: error.message, code, stack: error.stack };
}

export function createLogger(level: Env['LOG_LEVEL']): Logger {
  return pino({ level, base: null, serializers: { err: errorForLog } });
}

/** One line per request: no headers, no body, no query, for these carry cookies and what was typed. */
export function requestLog(logger: Logger) {
  return pinoHttp({
    logger,
    genReqId: () => randomUUID(),
    wrapSerializers: false,
    serializers: {
      err: errorForLog,
      req: (req: { id: string; method: string; originalUrl: string }) => ({
        id: req.id,
        method: req.method,
        path: req.originalUrl.split('?')[0],
      }),
      res: (res: { statusCode: number }) => ({ status: res.statusCode }),
    },
    // An error is logged once, where it is handled.
    customErrorObject: (_req, _res, _error, { err: _, ...line }: Record<string, unknown>) => line,
    customLogLevel: (req) => (req.url?.startsWith('/api/health') ? 'debug' : 'info'),
  });
}
