import { join } from 'node:path';

import { WorkerPool } from '../worker-pool';

export type PasswordTask = { kind: 'hash'; password: string } | { kind: 'compare'; password: string; hash: string };

/** Hash of a password that nobody has, so that an unknown account takes as long as a known one. */
export const UNKNOWN_ACCOUNT = '$2b$11$PN/WKDDWvvtCcURl3tMVYe9RZPJQ0vo0wIcCwOdataMBffRhRuShy';

/** bcrypt in a thread, so that no request waits for another's sign-in. */
export class Passwords {
  private readonly pool = new WorkerPool<PasswordTask, string | boolean>({
    filename: join(__dirname, 'password-worker.ts'),
    threads: 1,
    mostWaiting: 50,
  });

  async hash(password: string): Promise<string> {
    return String(await this.pool.run({ kind: 'hash', password }));
  }

  /** @param hash null where the account is unknown; the answer is false then, at the same pace */
  async matches(password: string, hash: string | null): Promise<boolean> {
    const same = await this.pool.run({ kind: 'compare', password, hash: hash ?? UNKNOWN_ACCOUNT });
    return hash !== null && same === true;
  }

  async close(): Promise<void> {
    await this.pool.close();
  }
}
