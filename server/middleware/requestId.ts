import type { NextFunction, Request, Response } from 'express';
import { v7 } from 'uuid';

/** Every request has an id of its own: in the log, in the answer's head and in a problem's `instance`. */
export function requestId(_req: Request, res: Response, next: NextFunction): void {
  const id = v7();
  res.locals['requestId'] = id;
  res.setHeader('X-Request-Id', id);
  next();
}

/** The id that `requestId` gave. */
export function requestIdOf(res: Response): string {
  return String(res.locals['requestId']);
}
