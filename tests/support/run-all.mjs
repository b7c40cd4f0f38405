/**
 * `npm test`: prepares all that the tests need, runs every stage and ends with 'N passed, N failed'.
 * `--only NAME` runs the stages whose names begin so.
 */
import { ensureClient } from '../../server/bin/launch/client-build.mjs';
import { endChildren } from '../../server/bin/launch/children.mjs';
import { ensurePackages } from '../../server/bin/launch/npm-packages.mjs';
import { makeLocal } from '../../server/bin/launch/paths.mjs';
import { Halt, say, seconds } from '../../server/bin/launch/say.mjs';
import { ensureChromium } from './chromium.mjs';
import { STAGES } from './stages.mjs';

const only = process.argv.includes('--only') ? process.argv[process.argv.indexOf('--only') + 1] : '';
const stages = STAGES.filter(({ name }) => name.startsWith(only));
const needed = new Set(stages.flatMap(({ needs }) => needs));

/** @returns what to stop at the end */
const prepare = async () => {
  makeLocal();
  await ensurePackages();
  if (needed.has('chromium')) ensureChromium();
  if (needed.has('client')) await ensureClient();
  if (!needed.has('cluster')) return null;
  const { openTestCluster } = await import('./test-cluster.mjs');
  const cluster = await openTestCluster();
  process.env.TEST_CLUSTER_URL = cluster.url;
  return cluster;
};

const runStages = async () => {
  const total = { passed: 0, failed: 0 };
  for (const { name, run } of stages) {
    const began = Date.now();
    say('run', name);
    const { passed, failed } = await run();
    total.passed += passed;
    total.failed += failed;
    say(failed === 0 ? 'passed' : 'FAILED', `${name}: ${passed} passed, ${failed} failed, ${seconds(began)}`);
  }
  return total;
};

const main = async () => {
  if (stages.length === 0) throw new Halt(`There is no stage "${only}". There are: ${STAGES.map(({ name }) => name).join(', ')}.`);
  const cluster = await prepare();
  const interrupt = async () => {
    endChildren();
    await cluster?.stop();
    process.exit(130);
  };
  process.once('SIGINT', interrupt).once('SIGTERM', interrupt);
  const { passed, failed } = await runStages();
  await cluster?.stop();
  console.log(`${passed} passed, ${failed} failed`);
  process.exitCode = failed === 0 && passed > 0 ? 0 : 1;
};

try {
  await main();
} catch (error) {
  console.error(error instanceof Halt ? `\n${error.message}` : error);
  console.log('0 passed, 1 failed');
  process.exitCode = 1;
}
