/** SQLSTATE classes and codes of a database that is away, starting, stopping or full of connections. */
const UNAVAILABLE_STATES = /^(08|57P0[1-5]|53300)/;
const UNREACHABLE_CODES = new Set(['ECONNREFUSED', 'ECONNRESET', 'EPIPE', 'ETIMEDOUT', 'ENOTFOUND', 'EHOSTUNREACH']);
/** pg tells these by their words alone. */
const BROKEN_CONNECTION = /Connection terminated|timeout exceeded when trying to connect|Client has encountered a connection error|not queryable/i;

interface ErrorShape {
  code?: unknown;
  message?: unknown;
  /** Several addresses were tried. */
  errors?: unknown;
  /** What TypeORM wraps. */
  driverError?: unknown;
}

const meansUnavailable = ({ code, message }: ErrorShape): boolean =>
  (typeof code === 'string' && (UNAVAILABLE_STATES.test(code) || UNREACHABLE_CODES.has(code))) || (typeof message === 'string' && BROKEN_CONNECTION.test(message));

/** Whether an error means that the database cannot be reached now, rather than that a statement was wrong. */
export const isDatabaseUnavailable = (error: unknown): boolean => {
  if (typeof error !== 'object' || error === null) return false;
  const { errors, driverError }: ErrorShape = error;
  if (meansUnavailable(error) || (Array.isArray(errors) && errors.some(isDatabaseUnavailable))) return true;
  return driverError !== error && isDatabaseUnavailable(driverError);
};
