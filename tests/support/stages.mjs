import { readFileSync, rmSync } from 'node:fs';

import { runChild } from '../../server/bin/launch/children.mjs';
import { local } from '../../server/bin/launch/paths.mjs';

const bin = (name) => `node_modules/.bin/${name}`;

/** A check that passes or fails as a whole. */
const whole = (name, command, args) => ({
  name,
  needs: [],
  run: async () => ((await runChild(command, args)) === 0 ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 }),
});

const readCounts = (file) => {
  try {
    const { numPassedTests, numFailedTests, numFailedTestSuites, numPendingTests } = JSON.parse(readFileSync(file, 'utf8'));
    const failed = Math.max(numFailedTests, numFailedTestSuites) + numPendingTests;
    return { passed: numPassedTests, failed };
  } catch {
    return { passed: 0, failed: 1 };
  }
};

/** One project of jest.config.js. No test at all counts as a failure, and so does one that is left out. */
const jest = (name, needs = [], more = []) => ({
  name,
  needs,
  run: async () => {
    const file = local(`results-${name}.json`);
    rmSync(file, { force: true });
    const status = await runChild(bin('jest'), ['--selectProjects', name, '--json', `--outputFile=${file}`, '--testLocationInResults=false', ...more], {
      stdio: ['ignore', 'ignore', 'inherit'],
    });
    const counts = readCounts(file);
    return status !== 0 && counts.failed === 0 ? { ...counts, failed: 1 } : counts;
  },
});

/** Everything that `npm test` runs, in this order; cheap and telling ones first. */
export const STAGES = [
  whole('typecheck', bin('tsc'), ['--noEmit', '-p', '.']),
  whole('typecheck-simulation', bin('tsc'), ['--noEmit', '-p', 'simulation']),
  whole('lint', bin('eslint'), ['--max-warnings', '0', '.']),
  whole('rules', bin('depcruise'), ['--config', '.dependency-cruiser.cjs', 'app', 'components', 'hooks', 'shared', 'server', 'simulation']),
  jest('architecture'),
  jest('unit'),
  jest('validation'),
  jest('components'),
  jest('api', ['cluster']),
  // One after the other: each starts a server with its own worker threads, and two cores are soon full.
  jest('e2e', ['cluster', 'client', 'chromium'], ['--runInBand']),
];
