import { existsSync } from 'node:fs';
import path from 'node:path';
import express, { Router } from 'express';
import type { NextFunction, Request, Response } from 'express';
import { env } from './env';
import { ROOT } from './paths';

const YEAR_SECONDS = 31_536_000;
/** Files named by their content never change; every other file is asked about again. */
const HASHED = /[.-][0-9a-f]{32}\.\w+$/;
const COMPRESSED = /\.(html|m?js|css|svg|json|webmanifest|txt)$/;

/** The exported web app: its files, and its page for every address that is one of its routes. */
export function webApp(): Router {
  const folder = path.resolve(ROOT, env.WEB_FOLDER);
  const router = Router();
  router.use(onlyReads, (req, _res, next) => {
    // An address of a route has no file; the page finds out what it shows.
    if (!/\.\w+$/.test(req.path)) req.url = '/index.html';
    next();
  });
  router.use(chooseEncoding(folder));
  router.use(
    express.static(folder, {
      index: false,
      redirect: false,
      etag: true,
      cacheControl: false,
      setHeaders: setCaching,
    }),
  );
  return router;
}

function onlyReads(req: Request, _res: Response, next: NextFunction): void {
  next(req.method === 'GET' || req.method === 'HEAD' ? undefined : 'router');
}

function setCaching(res: Response, file: string): void {
  const name = file.replace(/\.(br|gz)$/, '');
  const value = HASHED.test(name) ? `public, max-age=${YEAR_SECONDS}, immutable` : 'no-cache';
  res.setHeader('Cache-Control', value);
}

/** Answers with the file that the build compressed, where the browser takes it. */
function chooseEncoding(folder: string) {
  return (req: Request, res: Response, next: NextFunction): void => {
    const name = req.url.split('?')[0] ?? '';
    if (!COMPRESSED.test(name) || name.includes('..')) return next();
    res.vary('Accept-Encoding');
    for (const [encoding, suffix] of [
      ['br', '.br'],
      ['gzip', '.gz'],
    ] as const) {
      if (!req.acceptsEncodings(encoding)) continue;
      if (!existsSync(path.join(folder, `${name}${suffix}`))) continue;
      res.setHeader('Content-Encoding', encoding);
      res.type(path.extname(name));
      req.url = `${name}${suffix}`;
      return next();
    }
    next();
  };
}
