import { createHash } from 'node:crypto';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import type { DataSource } from 'typeorm';

import { ProblemError } from '../http/problem-error';

/** Free attempts in a window, for one account from one address. */
const FREE_ATTEMPTS = 10;
const WINDOW_SECONDS = 15 * 60;
const FIRST_DELAY_SECONDS = 30;

/** Seconds to wait after the n-th attempt in a window: none, then 30, 60, 120 … up to a whole window. */
export const delayAfter = (attempt: number): number =>
  attempt < FREE_ATTEMPTS ? 0 : Math.min(FIRST_DELAY_SECONDS * 2 ** (attempt - FREE_ATTEMPTS), WINDOW_SECONDS);

const tooMany = (milliseconds: number) => {
  const retryAfter = Math.max(1, Math.ceil(milliseconds / 1000));
  return new ProblemError('too-many-attempts', `Too many failed attempts from here. Wait ${retryAfter} s.`, { retryAfter });
};

/**
 * Slows down guessing. Counted for account and address together, so that the owner can still sign in
 * from elsewhere; counted before the password is looked at, so that attempts sent at once all count.
 */
export class SignInLimit {
  private readonly attempts: RateLimiterPostgres;
  private readonly pauses: RateLimiterPostgres;

  constructor(database: DataSource) {
    const shared = { storeClient: database, storeType: 'typeorm', tableName: 'sign_in_attempt', tableCreated: true };
    this.attempts = new RateLimiterPostgres({ ...shared, keyPrefix: 'attempts', points: FREE_ATTEMPTS, duration: WINDOW_SECONDS });
    this.pauses = new RateLimiterPostgres({ ...shared, keyPrefix: 'pause', points: 1, duration: FIRST_DELAY_SECONDS });
  }

  async attempt(email: string, address: string): Promise<{ succeeded: () => Promise<void> }> {
    const key = createHash('sha256').update(`${email}|${address}`).digest('hex');
    const pause = await this.pauses.get(key);
    if (pause && pause.msBeforeNext > 0) throw tooMany(pause.msBeforeNext);
    const { consumedPoints } = await this.attempts.penalty(key);
    const delay = delayAfter(consumedPoints);
    if (delay > 0) await this.pauseFor(key, delay);
    return {
      succeeded: async () => {
        await Promise.all([this.attempts.delete(key), this.pauses.delete(key)]);
      },
    };
  }

  private async pauseFor(key: string, seconds: number): Promise<void> {
    try {
      await this.pauses.consume(key, 1, { customDuration: seconds });
    } catch (refused) {
      throw refused instanceof RateLimiterRes ? tooMany(refused.msBeforeNext) : refused;
    }
  }
}
