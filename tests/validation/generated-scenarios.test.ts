import { spawnSync } from 'node:child_process';
import { join } from 'node:path';

import { problemText, InputProblem } from '../../server/bin/simulate/problem';
import { readScenario } from '../../server/bin/simulate/read-scenario';
import { badScenarios, names, type BadScenario } from '../support/bad-scenarios';

const ROOT = join(__dirname, '../..');
/** Set TIDEGATE_SEED to try others; a failing one is printed. */
const SEED = Number(process.env.TIDEGATE_SEED ?? 20_261_201);
const BAD = 1000;
const BAD_THROUGH_THE_PROCESS = 10;

const refusal = (scenario: unknown): InputProblem | null => {
  try {
    readScenario(JSON.stringify(scenario));
    return null;
  } catch (error) {
    if (error instanceof InputProblem) return error;
    throw error;
  }
};

const describeFailure = ({ mutation, field }: BadScenario, told: string) => `seed ${SEED}: ${mutation}: ${field} was not named, but ${told}`;

describe(`bad scenarios (seed ${SEED})`, () => {
  const bad = badScenarios(BAD, SEED);

  it(`${BAD} are refused with the field named, in plain words`, () => {
    for (const one of bad) {
      const problem = refusal(one.scenario);
      if (!problem) throw new Error(describeFailure(one, 'it was accepted'));
      const named = problem.issues.some(({ path }) => names(path, one.field));
      if (!named) throw new Error(describeFailure(one, problemText(problem)));
      for (const { message } of problem.issues) expect(message).not.toMatch(/undefined|\[object|NaN is|expected .* received/);
    }
  });

  it('the same seed gives the same scenarios', () => expect(badScenarios(50, SEED)).toEqual(badScenarios(50, SEED)));

  it.each(bad.slice(0, BAD_THROUGH_THE_PROCESS).map((one) => [one.mutation.slice(0, 80), one] as const))('through the command: %s', (_, { scenario, field }) => {
    const { status, stdout, stderr } = spawnSync(process.execPath, ['-r', './server/bin/typescript-hook.js', 'server/bin/simulate.ts', '-'], { cwd: ROOT, input: JSON.stringify(scenario), encoding: 'utf8' });
    expect({ status, stdout }).toEqual({ status: 2, stdout: '' });
    const { issues } = JSON.parse(stderr.trim().split('\n').at(-1)!) as { issues: { path: string }[] };
    expect(issues.some(({ path }) => names(path, field))).toBe(true);
  });
});
