import { openTestCluster } from './test-cluster.mjs';

/** Where a test file is run alone, it still finds a cluster; `npm test` has started one for all. */
export default async function startCluster() {
  if (process.env.TEST_CLUSTER_URL) return;
  globalThis.testCluster = await openTestCluster();
  process.env.TEST_CLUSTER_URL = globalThis.testCluster.url;
}
