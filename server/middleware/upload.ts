import type { NextFunction, Request, Response } from 'express';
import multer from 'multer';
import { malformedRequest } from '../problem';

const MAX_BYTES = 15 * 1024 * 1024;

const readOne = multer({
  storage: multer.memoryStorage(),
  limits: { fileSize: MAX_BYTES, files: 1, fields: 8, fieldSize: 8192, parts: 10 },
}).single('file');

/** Reads one file of at most 15 MB and the fields beside it; a body that is cut off or broken is 400. */
export function upload(req: Request, res: Response): Promise<Express.Multer.File | undefined> {
  return new Promise((resolve, reject) => {
    const done: NextFunction = (fault?: unknown) => {
      if (fault === undefined || fault === null) resolve(req.file);
      else if (fault instanceof multer.MulterError) reject(fault);
      else reject(malformedRequest(400, 'The upload cannot be read.'));
    };
    void readOne(req, res, done);
  });
}
