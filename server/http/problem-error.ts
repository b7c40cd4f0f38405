import type { Problem } from '../../shared/contracts/problem';
import type { ErrorCode } from '../../shared/error-codes';

/** What each code stands for; `title` never changes from one occurrence to the next (RFC 9457, 3.1.3). */
export const PROBLEMS: Record<ErrorCode, { status: number; title: string }> = {
  'invalid-input': { status: 400, title: 'A field is missing or wrong' },
  'malformed-body': { status: 400, title: 'The body is not usable JSON' },
  'not-signed-in': { status: 401, title: 'Not signed in' },
  'wrong-credentials': { status: 401, title: 'E-mail or password is wrong' },
  'not-allowed': { status: 403, title: 'Your role does not allow this' },
  'cross-site': { status: 403, title: 'The request did not come from these pages' },
  'not-found': { status: 404, title: 'There is nothing here' },
  'version-conflict': { status: 409, title: 'The record has changed in the meantime' },
  'body-too-large': { status: 413, title: 'The body is too large' },
  'unsupported-media': { status: 415, title: 'The body must be plain application/json' },
  'too-many-attempts': { status: 429, title: 'Too many attempts' },
  internal: { status: 500, title: 'Something went wrong on the server' },
  busy: { status: 503, title: 'The server is busy computing' },
  'database-unavailable': { status: 503, title: 'The database cannot be reached' },
};

type Extras = Pick<Problem, 'issues' | 'conflict'> & {
  /** Seconds. */
  retryAfter?: number;
  cause?: unknown;
};

/** The one kind of error that the server throws on purpose. Everything in it may be shown to the client. */
export class ProblemError extends Error {
  readonly status: number;

  constructor(
    readonly code: ErrorCode,
    readonly detail?: string,
    readonly extras: Extras = {},
  ) {
    super(detail ?? PROBLEMS[code].title, { cause: extras.cause });
    this.status = PROBLEMS[code].status;
  }
}
