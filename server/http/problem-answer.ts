import type { ErrorRequestHandler, Request, RequestHandler, Response } from 'express';

import type { Problem } from '../../shared/contracts/problem';
import { isDatabaseUnavailable } from '../database/availability';
import { ProblemError, PROBLEMS } from './problem-error';

const RETRY_SOON = 2;

/** Errors of Express and its parsers carry a `type`; whatever is unknown becomes an opaque 500. */
export const toProblemError = (error: unknown): ProblemError => {
  if (error instanceof ProblemError) return error;
  if (isDatabaseUnavailable(error))
    return new ProblemError('database-unavailable', 'Nothing was saved. It usually comes back by itself; try again in a moment.', { retryAfter: RETRY_SOON, cause: error });
  const type = error instanceof Error && 'type' in error ? error.type : null;
  if (type === 'entity.too.large') return new ProblemError('body-too-large', 'Send at most 256 kB.');
  if (type === 'encoding.unsupported' || type === 'charset.unsupported')
    return new ProblemError('unsupported-media', 'Send uncompressed JSON in UTF-8.');
  if (type === 'entity.parse.failed' || type === 'request.aborted' || type === 'request.size.invalid')
    return new ProblemError('malformed-body', 'The body could not be read as JSON.');
  if (error instanceof URIError) return new ProblemError('not-found');
  return new ProblemError('internal', undefined, { cause: error });
};

const problemOf = (error: ProblemError, request: Request): Problem => ({
  type: `/api/docs#${error.code}`,
  title: PROBLEMS[error.code].title,
  status: error.status,
  ...(error.detail === undefined ? {} : { detail: error.detail }),
  instance: `urn:uuid:${String(request.id)}`,
  code: error.code,
  ...(error.extras.issues ? { issues: error.extras.issues } : {}),
  ...(error.extras.conflict === undefined ? {} : { conflict: error.extras.conflict }),
});

const sendProblem = (error: ProblemError, request: Request, response: Response): void => {
  if (error.extras.retryAfter !== undefined) response.set('Retry-After', String(Math.ceil(error.extras.retryAfter)));
  if (error.status === 401) response.set('WWW-Authenticate', 'Bearer realm="Tidegate"');
  response.status(error.status).type('application/problem+json').send(JSON.stringify(problemOf(error, request)));
};

export const answerProblems: ErrorRequestHandler = (thrown: unknown, request, response, next) => {
  const error = toProblemError(thrown);
  if (error.code === 'internal') request.log.error({ err: thrown }, 'unexpected error');
  else if (error.code === 'database-unavailable') request.log.warn({ err: thrown }, 'database unavailable');
  if (response.headersSent) next(thrown);
  else sendProblem(error, request, response);
};

export const answerNotFound: RequestHandler = (request) => {
  throw new ProblemError('not-found', `The API has no ${request.method} ${request.originalUrl.split('?')[0]}.`);
};
