/** Every error the API can answer with; the client has a sentence for each. */
export const ERROR_CODES = [
  'invalid-input', // 400: a field is named in `issues`
  'malformed-body', // 400: not JSON, too deep or too large for JSON
  'not-signed-in', // 401
  'wrong-credentials', // 401
  'not-allowed', // 403
  'cross-site', // 403: an unsafe request that did not come from the app's own pages
  'not-found', // 404, also for another team's record
  'version-conflict', // 409: `conflict` holds the record as it is now
  'body-too-large', // 413
  'unsupported-media', // 415
  'too-many-attempts', // 429
  'internal', // 500: with an instance id to quote
  'busy', // 503: the queue of runs is full
  'database-unavailable', // 503
] as const;
export type ErrorCode = (typeof ERROR_CODES)[number];
