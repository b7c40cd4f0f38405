import { randomBytes } from 'node:crypto';
import { readdirSync, rmSync } from 'node:fs';

import { LOCAL, local, makeLocal } from '../../server/bin/launch/paths.mjs';
import { PostgresCluster } from '../../server/bin/launch/postgres-cluster.mjs';
import { clearRemains, runningPostmaster } from '../../server/bin/launch/postmaster.mjs';
import { isAlive } from '../../server/bin/launch/processes.mjs';

const PREFIX = 'test-cluster-';

/** Nothing in it outlives the run, so it need not survive a power cut either. */
const CARELESS = { fsync: 'off', full_page_writes: 'off', synchronous_commit: 'off', max_connections: 200, autovacuum: 'off' };

const discard = async (folder) => {
  const data = `${folder}/data`;
  const running = runningPostmaster(data);
  if (running) process.kill(running.pid, 'SIGKILL');
  await clearRemains(data);
  rmSync(folder, { recursive: true, force: true });
};

/** Runs that were killed could not clear up. */
const discardForgotten = async () => {
  for (const name of readdirSync(LOCAL).filter((entry) => entry.startsWith(PREFIX))) {
    if (!isAlive(name.slice(PREFIX.length))) await discard(local(name));
  }
};

/** A cluster for one run of tests; several runs may go on side by side. */
export const openTestCluster = async () => {
  makeLocal();
  await discardForgotten();
  const password = randomBytes(24).toString('base64url');
  const cluster = new PostgresCluster({
    wanted: local(`${PREFIX}${process.pid}`),
    port: 15_432,
    passwords: { administrator: password, application: password },
    settings: CARELESS,
    quiet: true,
  });
  await cluster.open();
  return {
    url: cluster.url('postgres', { administrator: true }),
    stop: async () => {
      await cluster.stop();
      await discard(cluster.folder);
    },
  };
};
