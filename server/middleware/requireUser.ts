import type { NextFunction, Request, RequestHandler, Response } from 'express';
import type { Role } from '@/shared/user';
import { currentUser } from '../currentUser';
import { notAllowed } from '../problem';

export { currentUser } from '../currentUser';

/** 401 before anything else is looked at. */
export function requireUser(req: Request, _res: Response, next: NextFunction): void {
  currentUser(req);
  next();
}

/** 403 for every other role. */
export function requireRole(...roles: Role[]): RequestHandler {
  return (req, _res, next) => {
    if (!roles.includes(currentUser(req).role)) throw notAllowed();
    next();
  };
}
