import type { Simulated } from '../../shared/contracts/simulation';
import type { Scenario } from '../../shared/model/scenario';
import { ProblemError } from '../http/problem-error';
import type { WorkerPool } from '../worker-pool';
import type { SimulationTask } from './simulation-worker';
import { WARM_UP_SCENARIO } from './warm-up-scenario';

/** Stopping a thread throws away its compiled code; a run that ends by itself within this time is cheaper. */
const LET_FINISH = 1000;
/** No scenario takes nearly as long; a run that does is a mistake of ours and must not hold a thread for ever. */
const TIME_LIMIT = 30_000;

export type SimulationPool = WorkerPool<SimulationTask, Simulated>;

/** Runs the engine in threads, so that the thread that answers requests stays free. */
export class SimulationService {
  constructor(
    private readonly pool: SimulationPool,
    private readonly timeLimit = TIME_LIMIT,
  ) {}

  /** Runs that wait for a thread. */
  get waiting(): number {
    return this.pool.waiting;
  }

  /** Computes once in every thread, so that the first person does not wait for the code to be loaded and compiled. */
  async warmUp(): Promise<void> {
    await Promise.all(Array.from({ length: this.pool.threads }, () => this.assess(WARM_UP_SCENARIO)));
  }

  /**
   * @param signal of a client that may hang up: what waits is dropped at once, what runs is given a moment to end by itself
   * @throws {ProblemError} when there was no answer within the time limit
   */
  async assess(scenario: Scenario, signal?: AbortSignal): Promise<Simulated> {
    const word = new SharedArrayBuffer(4);
    const begun = () => Atomics.load(new Int32Array(word), 0) === 1;
    const stop = new AbortController();
    const timers = [setTimeout(() => stop.abort(this.overdue(begun())), this.timeLimit)];
    const hangUp = () => {
      if (begun()) timers.push(setTimeout(() => stop.abort(), LET_FINISH));
      else stop.abort();
    };
    if (signal?.aborted) hangUp();
    signal?.addEventListener('abort', hangUp, { once: true });
    try {
      return await this.pool.run({ scenario, begun: word }, stop.signal);
    } catch (error) {
      throw stop.signal.reason instanceof ProblemError ? stop.signal.reason : error;
    } finally {
      timers.forEach(clearTimeout);
      signal?.removeEventListener('abort', hangUp);
    }
  }

  private overdue(begun: boolean): ProblemError {
    const seconds = this.timeLimit / 1000;
    return begun
      ? new ProblemError('internal', `The run took longer than ${seconds} s and was stopped. A shorter duration may help.`)
      : new ProblemError('busy', `The run waited for ${seconds} s behind others and was dropped; try again in a moment.`);
  }

  async close(): Promise<void> {
    await this.pool.close();
  }
}
