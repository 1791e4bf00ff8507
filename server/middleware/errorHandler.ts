import type { NextFunction, Request, Response } from 'express';
import { logger } from '../log';
import { Problem, toProblem, toProblemDocument } from '../problem';
import { requestIdOf } from './requestId';

/** Every fault leaves the server here, as a problem document. An unforeseen one is logged once and says nothing of itself. */
export function errorHandler(
  error: unknown,
  _req: Request,
  res: Response,
  next: NextFunction,
): void {
  if (res.writableEnded) return afterTheAnswer(error, res);
  if (res.headersSent) return next(error);
  const problem = toProblem(error) ?? unexpected(error, res);
  // Nothing of the answer that was being prepared goes out with the problem.
  for (const name of ['ETag', 'Content-Disposition']) res.removeHeader(name);
  for (const [name, value] of Object.entries(problem.options.headers ?? {})) {
    res.setHeader(name, value);
  }
  res
    .status(problem.status)
    .type('application/problem+json')
    .send(JSON.stringify(toProblemDocument(problem, requestIdOf(res))));
}

/** The session store may fail to note the visit once the answer is out: nobody is left to tell. */
function afterTheAnswer(error: unknown, res: Response): void {
  const { name, message } = error instanceof Error ? error : new Error(String(error));
  logger.warn({ requestId: requestIdOf(res), name, message }, 'a fault after the answer');
}

function unexpected(error: unknown, res: Response): Problem {
  const { name, message, stack } = error instanceof Error ? error : new Error(String(error));
  logger.error({ requestId: requestIdOf(res), name, message, stack }, 'unexpected fault');
  return new Problem('unexpected');
}
