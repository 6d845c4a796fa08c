import { randomUUID } from 'node:crypto';
import type { IncomingMessage, ServerResponse } from 'node:http';
import type { Request, RequestHandler } from 'express';
import { pino, type DestinationStream, type Logger } from 'pino';
import { pinoHttp } from 'pino-http';

/** JSON lines on standard output, or to `destination`. */
export const createLogger = (level: string, destination?: DestinationStream): Logger =>
  pino({ level, base: { app: 'tidyrun' }, timestamp: pino.stdTimeFunctions.isoTime }, destination ?? pino.destination(1));

/** The declared route and not the address, which may hold a token or whatever a stranger typed. */
const routeOf = (request: IncomingMessage): string => {
  const { route, originalUrl } = request as Partial<Pick<Request, 'originalUrl'>> & { route?: { path?: unknown } };
  if (typeof route?.path === 'string') return route.path;
  return originalUrl?.startsWith('/api') ? 'unknown' : 'page';
};

/** One line a request: method, route, status, time. No address, no query, no header, no cookie, no body. */
export const logRequests = (logger: Logger): RequestHandler => pinoHttp({
  logger, genReqId: () => randomUUID(), quietReqLogger: true,
  serializers: { req: () => undefined, res: () => undefined, err: () => undefined },
  customLogLevel: (_request, response) => (response.statusCode >= 500 ? 'warn' : 'info'),
  customSuccessMessage: () => 'request', customErrorMessage: () => 'request',
  customSuccessObject: lineOf, customErrorObject: lineOf,
  autoLogging: { ignore: (request) => request.url === '/api/health' },
});

const lineOf = (request: IncomingMessage, response: ServerResponse, value?: unknown): Record<string, unknown> => {
  const { responseTime } = (value ?? {}) as { responseTime?: number };
  return { method: request.method, route: routeOf(request), status: response.statusCode, ms: responseTime };
};
