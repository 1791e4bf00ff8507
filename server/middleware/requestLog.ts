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

/** One line a request: id, method, route pattern, status, milliseconds, user id. Nothing of the content. */
export const requestLog = pinoHttp<Request, Response>({
  logger,
  quietReqLogger: true,
  serializers: { req: () => undefined, res: () => undefined, err: () => undefined },
  customAttributeKeys: { responseTime: 'ms' },
  customLogLevel: () => 'info',
  customSuccessMessage: () => 'request',
  customErrorMessage: () => 'request',
  customProps: (req, res) => ({
    requestId: requestIdOf(res),
    method: req.method,
    route: routePattern(req),
    status: res.statusCode,
    userId: req.user?.id,
  }),
});
