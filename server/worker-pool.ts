import { join } from 'node:path';
import { Piscina } from 'piscina';

const TYPESCRIPT_HOOK = join(__dirname, 'bin', 'typescript-hook.js');

export interface WorkerPoolOptions {
  /** Full path, with its extension; it exports the task as `run`. */
  filename: string;
  threads: number;
  /** Tasks that may wait; one more is refused. */
  maxQueue: number;
}

/** Threads that run one TypeScript file; all of them start at once and stay. */
export const createWorkerPool = <Task, Result>({ filename, threads, maxQueue }: WorkerPoolOptions): Piscina<Task, Result> =>
  new Piscina<Task, Result>({ filename, name: 'run', minThreads: threads, maxThreads: threads, maxQueue, execArgv: ['-r', TYPESCRIPT_HOOK] });
