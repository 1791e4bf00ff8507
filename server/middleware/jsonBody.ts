import express from 'express';
import type { NextFunction, Request, Response } from 'express';
import { malformedRequest } from '../problem';

const LIMIT_BYTES = 512 * 1024;
const readJson = express.json({ limit: LIMIT_BYTES });
/** The one route that takes something else: `multer` reads it there. */
const UPLOAD = /^\/worksheets\/[^/]+\/attachments\/?$/;

/** Reads a JSON body. Another kind of body is 415; none at all is an empty object, so that every missing field is named. */
export function jsonBody(req: Request, res: Response, next: NextFunction): void {
  if (!hasBody(req)) {
    req.body = {};
    return next();
  }
  if (UPLOAD.test(req.path) && req.is('multipart/form-data') !== false) return next();
  if (req.is('application/json') === false) {
    throw malformedRequest(415, 'Send the content as application/json.');
  }
  readJson(req, res, next);
}

function hasBody(req: Request): boolean {
  const length = req.headers['content-length'];
  return req.headers['transfer-encoding'] !== undefined || (length !== undefined && length !== '0');
}
