/** SQLSTATE classes and codes of a database that is away, starting, stopping or full of connections. */
const UNAVAILABLE_STATES = /^(08|57P0[1-5]|53300)/;
const UNREACHABLE_CODES = new Set(['ECONNREFUSED', 'ECONNRESET', 'EPIPE', 'ETIMEDOUT', 'ENOTFOUND', 'EHOSTUNREACH']);
/** pg tells these by their words alone. */
const BROKEN_CONNECTION = /Connection terminated|timeout exceeded when trying to connect|Client has encountered a connection error|not queryable/i;

/** Whether an error means that the database cannot be reached now, rather than that a statement was wrong. */
export const isDatabaseUnavailable = (error: unknown): boolean => {
  if (!(error instanceof Error)) return false;
  const code = 'code' in error && typeof error.code === 'string' ? error.code : '';
  if (UNAVAILABLE_STATES.test(code) || UNREACHABLE_CODES.has(code) || BROKEN_CONNECTION.test(error.message)) return true;
  if (error instanceof AggregateError) return error.errors.some(isDatabaseUnavailable);
  return 'driverError' in error && error.driverError !== error && isDatabaseUnavailable(error.driverError);
};
