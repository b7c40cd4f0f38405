import { ERROR_CODES, type ErrorCode } from '@/shared/error-codes';

export interface FieldIssue {
  /** Field, such as `bulk.capacitance`. */
  path: string;
  message: string;
}

interface Details {
  status: number;
  /** Id of this occurrence, also in the server's log. */
  instance?: string | undefined;
  issues?: readonly FieldIssue[];
  /** With `version-conflict`: the record as it is now. */
  conflict?: unknown;
}

/** The server answered, and refused. */
export class ApiError extends Error {
  override readonly name = 'ApiError';

  constructor(
    readonly code: ErrorCode,
    readonly details: Details,
  ) {
    super(code);
  }
}

/** No answer came: the network or the server is away. */
export class OfflineError extends Error {
  override readonly name = 'OfflineError';
}

const isObject = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null;
const isCode = (value: unknown): value is ErrorCode => (ERROR_CODES as readonly unknown[]).includes(value);
const isIssue = (value: unknown): value is FieldIssue => isObject(value) && typeof value.path === 'string' && typeof value.message === 'string';

/** Reads problem details (RFC 9457); whatever is not one of ours counts as an internal error. */
export const decodeProblem = (status: number, body: unknown): ApiError => {
  if (!isObject(body) || !isCode(body.code)) return new ApiError(status === 503 ? 'busy' : 'internal', { status });
  return new ApiError(body.code, {
    status,
    instance: typeof body.instance === 'string' ? body.instance : undefined,
    issues: Array.isArray(body.issues) ? body.issues.filter(isIssue) : [],
    conflict: body.conflict,
  });
};
