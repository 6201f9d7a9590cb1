import type { ErrorRequestHandler, RequestHandler, Response } from 'express';
import type { Logger } from 'pino';

import { loggable } from './loggable';
import { ProblemError } from './problem-error';

/** Turns every failure of an API request into `application/problem+json`; what nobody expected is logged once, untold. */
export function problemHandler(log: Logger): ErrorRequestHandler {
  // Express knows an error handler by its four parameters.
  return (error: unknown, req, res, next) => {
    const problem = asProblem(error);
    if (!problem)
      log.error({ failure: loggable(error), requestId: req.id, method: req.method, path: req.path }, 'request failed');
    if (res.headersSent) {
      // Half an answer is out; only closing the connection tells the client that it is not whole.
      next(error);
      return;
    }
    sendProblem(res, problem ?? new ProblemError('internal_error', 'The server made a mistake. Nothing was changed.'));
  };
}

/** Answers every API address that no route knows. */
export function noSuchAddress(): RequestHandler {
  return (req) => {
    throw new ProblemError('not_found', `There is nothing at ${req.method} ${req.path}.`);
  };
}

export function sendProblem(res: Response, problem: ProblemError): void {
  res.status(problem.status).set('Cache-Control', 'no-store');
  res.type('application/problem+json').send(JSON.stringify(problem.toProblem()));
}

function asProblem(error: unknown): ProblemError | null {
  if (error instanceof ProblemError) return error;
  // What express.json() and the router throw carries a type or a status of its own.
  const { type, status } = error as { readonly type?: string; readonly status?: number };
  if (type === 'entity.parse.failed') {
    return new ProblemError('malformed_json', 'The body of the request is not JSON.');
  }
  if (type === 'entity.too.large')
    return new ProblemError('body_too_large', 'The request is larger than the server takes.');
  if (type === 'charset.unsupported' || type === 'encoding.unsupported') {
    return new ProblemError('media_type_refused', 'The body has to be JSON in UTF-8.');
  }
  if (type === 'request.aborted' || type === 'request.size.invalid' || status === 400) {
    return new ProblemError('validation_failed', 'The request did not arrive whole or its address is not right.');
  }
  return null;
}
