import { join } from 'node:path';
import { Piscina } from 'piscina';

import { ProblemError } from './http/problem-error';

const TYPESCRIPT_HOOK = join(__dirname, 'bin', 'typescript-hook.js');
const RETRY_AFTER = 2;

export interface WorkerPoolOptions {
  /** Full path, with its extension; it exports the task as `run`. */
  filename: string;
  threads: number;
  /** Tasks that may wait; one more is refused. */
  mostWaiting: number;
}

/** Threads that run one TypeScript file; all of them start at once and stay. */
export class WorkerPool<Task, Result> {
  readonly threads: number;
  private readonly mostWaiting: number;
  private readonly pool: Piscina<Task, Result>;

  constructor({ filename, threads, mostWaiting }: WorkerPoolOptions) {
    this.threads = threads;
    this.mostWaiting = mostWaiting;
    this.pool = new Piscina<Task, Result>({ filename, name: 'run', minThreads: threads, maxThreads: threads, execArgv: ['-r', TYPESCRIPT_HOOK] });
  }

  /** Tasks that wait for a thread. */
  get waiting(): number {
    return this.pool.queueSize;
  }

  /**
   * @param signal drops a waiting task, and stops the thread of a running one
   * @throws {ProblemError} busy, when too many wait already
   */
  run(task: Task, signal?: AbortSignal): Promise<Result> {
    // Piscina's own maxQueue lets tasks through that come one by one (5.3.2), so it is counted here.
    if (this.waiting >= this.mostWaiting)
      return Promise.reject(new ProblemError('busy', 'Others are waiting already; try again in a moment.', { retryAfter: RETRY_AFTER }));
    return this.pool.run(task, signal ? { signal } : {});
  }

  close(): Promise<void> {
    return this.pool.destroy();
  }
}
