const MINUTE = 60_000;

/** All in milliseconds. */
export const SESSION_LIMITS = {
  access: 10 * MINUTE,
  idle: 30 * MINUTE,
  absolute: 12 * 60 * MINUTE,
  /** Requests that left together with the same refresh token are all served. */
  reuseGrace: 10_000,
  /** How exactly the last sign of life is kept. */
  lastSeenStep: MINUTE,
} as const;
