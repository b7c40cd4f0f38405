import type { Simulated } from '../../shared/contracts/simulation';
import type { Scenario } from '../../shared/model/scenario';
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
  constructor(private readonly pool: SimulationPool) {}

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
   */
  async assess(scenario: Scenario, signal?: AbortSignal): Promise<Simulated> {
    const begun = new SharedArrayBuffer(4);
    const stop = new AbortController();
    const timers = [setTimeout(() => stop.abort(), TIME_LIMIT)];
    const hangUp = () => {
      if (Atomics.load(new Int32Array(begun), 0) === 0) stop.abort();
      else timers.push(setTimeout(() => stop.abort(), LET_FINISH));
    };
    if (signal?.aborted) hangUp();
    signal?.addEventListener('abort', hangUp, { once: true });
    try {
      return await this.pool.run({ scenario, begun }, stop.signal);
    } finally {
      timers.forEach(clearTimeout);
      signal?.removeEventListener('abort', hangUp);
    }
  }

  async close(): Promise<void> {
    await this.pool.close();
  }
}
