import type { Request, Response } from 'express';
import { pinoHttp } from 'pino-http';
import { logger } from '../log';
import { requestIdOf } from './requestId';

/** The pattern, not the address: an address can carry a token of a password reset. */
function routePattern(req: Request): string {
  const route: unknown = req.route;
  if (typeof route !== 'object' || route === null || !('path' in route)) return 'unmatched';
  return `${req.baseUrl}${String(route.path)}`;
}

const facts = (req: Request, res: Response, { ms }: { ms: number }) => ({
  method: req.method,
  route: routePattern(req),
  status: res.statusCode,
  ms,
  userId: req.user?.id,
});

/** One line a request: id, method, route pattern, status, milliseconds, user id. Nothing of the content. */
export const requestLog = pinoHttp<Request, Response>({
  logger,
  quietReqLogger: true,
  quietResLogger: true,
  genReqId: (_req, res) => requestIdOf(res),
  serializers: { req: () => undefined, res: () => undefined, err: () => undefined },
  customAttributeKeys: { responseTime: 'ms', reqId: 'requestId' },
  customLogLevel: () => 'info',
  customSuccessMessage: () => 'request',
  customErrorMessage: () => 'request',
  customSuccessObject: (req, res, { ms }: { ms: number }) => facts(req, res, { ms }),
  customErrorObject: (req, res, _error, { ms }: { ms: number }) => facts(req, res, { ms }),
});
