import { setTimeout as wait } from 'node:timers/promises';

import { say } from './say.mjs';

/** Brings PostgreSQL back on the same port whenever it ends unasked. */
export const watchDatabase = async (cluster, isStopping) => {
  for (let pause = 1000; ; ) {
    await wait(pause);
    if (isStopping()) return;
    if (cluster.isRunning()) {
      pause = 1000;
      continue;
    }
    say('database', 'ended unasked, starting it again');
    try {
      await cluster.start({ samePort: true });
      pause = 1000;
    } catch (error) {
      say('database', error.message);
      pause = Math.min(pause * 2, 30_000);
    }
  }
};
