import type { NextFunction, Request, Response } from 'express';
import { env } from '../env';
import { foreignOrigin } from '../problem';

const READS = new Set(['GET', 'HEAD', 'OPTIONS']);

/** A page of another site may not act with this site's cookie. A request with neither header is no browser's. */
export function originCheck(req: Request, _res: Response, next: NextFunction): void {
  if (READS.has(req.method)) return next();
  const { origin } = req.headers;
  const site = req.headers['sec-fetch-site'];
  if (site !== undefined && site !== 'same-origin' && site !== 'none') throw foreignOrigin();
  if (origin !== undefined && !isOwn(origin, req.headers.host)) throw foreignOrigin();
  next();
}

function isOwn(origin: string, host: string | undefined): boolean {
  try {
    const url = new URL(origin);
    return env.PUBLIC_URL === undefined
      ? url.host === host
      : url.origin === new URL(env.PUBLIC_URL).origin;
  } catch {
    return false;
  }
}
