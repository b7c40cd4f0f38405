import { endChildren } from './children.mjs';
import { say } from './say.mjs';
import { releaseLock } from './start-lock.mjs';

/** Ends what was started, in order: when asked to, and when npm or the terminal is gone. Asked twice, it does not wait. */
export class StopSwitch {
  server = null;
  cluster = null;
  stopping = false;

  arm() {
    // Whoever read our lines may be gone; that is no reason to fall.
    process.stdout.on('error', () => {});
    for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void this.stop('stopping'));
    if (process.env.npm_lifecycle_event) this.#watchParent();
  }

  /** npm that was killed sends no signal; its child only gets another parent. */
  #watchParent() {
    const parent = process.ppid;
    setInterval(() => {
      if (process.ppid !== parent && !this.stopping) void this.stop('npm has ended, stopping');
    }, 500).unref();
  }

  async stop(reason, code = 0) {
    endChildren();
    if (this.stopping) {
      this.server?.kill();
      void this.cluster?.stop();
      releaseLock();
      process.exit(code);
    }
    this.stopping = true;
    say('stop', reason);
    await this.server?.stop();
    await this.cluster?.stop();
    releaseLock();
    process.exit(code);
  }
}
