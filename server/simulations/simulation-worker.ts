import type { Simulated } from '../../shared/contracts/simulation';
import type { Scenario } from '../../shared/model/scenario';
import { assess } from '../../simulation';

export interface SimulationTask {
  scenario: Scenario;
  /** One 32-bit word that the thread sets to 1 when it begins, so that the sender knows what a cancellation would cost. */
  begun: SharedArrayBuffer;
}

/** Runs in a thread. */
export const run = ({ scenario, begun }: SimulationTask): Simulated => {
  Atomics.store(new Int32Array(begun), 0, 1);
  const start = performance.now();
  const assessment = assess(scenario);
  return { assessment, milliseconds: performance.now() - start };
};
