import type { Request, Response } from 'express';
import { notFound } from '../problem';

/** Whatever no route answered. */
export function notFoundHandler(_req: Request, _res: Response): never {
  throw notFound();
}
