import type { Request, Response } from 'express';
import { pinoHttp } from 'pino-http';
import { logger } from '../log';
import { requestIdOf } from './requestId';

/** The pattern, not the address: an address can carry a token of a password reset. */
function routePattern(req: Request): string {
  const route: unknown = req.route;
  if (typeof route !== 'object' || route === null || !('path' in route)) return 'unmatched';
  const path = String(route.path);
  return `${mountOf(req, path)}${path}`;
}

/** Where the router of the route hangs. Express forgets it on the way to the error handler: `/api/users` again from the address. */
function mountOf(req: Request, path: string): string {
  if (req.baseUrl !== '') return req.baseUrl;
  const [, api, name] = (req.originalUrl.split('?')[0] ?? '').split('/');
  return path.startsWith(`/${name}`) ? `/${api}` : `/${api}/${name}`;
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
