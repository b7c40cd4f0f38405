import { appendFileSync, existsSync } from 'node:fs';

import type { SimulationTask } from '../../server/simulations/simulation-worker';

const never = new Int32Array(new SharedArrayBuffer(4));

/**
 * Stands in for the engine: says in the file named by the notes that the run began, and holds its thread
 * until the test lays down the file's companion ".release".
 */
export const run = ({ scenario, begun }: SimulationTask): unknown => {
  Atomics.store(new Int32Array(begun), 0, 1);
  appendFileSync(scenario.notes, `${scenario.name}\n`);
  while (!existsSync(`${scenario.notes}.release`)) Atomics.wait(never, 0, 0, 10);
  return { assessment: { of: scenario.name }, milliseconds: 0 };
};
