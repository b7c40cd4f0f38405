import { spawn } from 'node:child_process';
import { closeSync, existsSync, openSync, readFileSync, renameSync, statSync } from 'node:fs';
import { setTimeout as wait } from 'node:timers/promises';

import { ROOT, local } from './paths.mjs';
import { freePort, isFree } from './ports.mjs';
import { endProcess, mark } from './processes.mjs';
import { Halt, say, seconds } from './say.mjs';
import { keepServerMark, readServerMark } from './start-lock.mjs';

const LOG = local('server.log');
const LOG_LIMIT = 20_000_000;
/** Starts that end before the server was ever ready; more would not help. */
const FIRST_ATTEMPTS = 3;
const LONGEST_PAUSE = 10_000;
/** Milliseconds after which a fall is a new one, not the last one's repetition. */
const SETTLED = 30_000;

/** The end of the log in the server's plain words; its JSON lines only where there are no others. */
const lastWords = () => {
  const lines = readFileSync(LOG, 'utf8').trim().split('\n').slice(-60);
  const plain = lines.filter((line) => !line.startsWith('{'));
  return (plain.length > 0 ? plain : lines).slice(-12).join('\n');
};

/** The server as a process of its own, brought back whenever it ends unasked. */
export class ServerProcess {
  #env;
  #fixed;
  #child = null;
  #stopping = false;
  #announce;

  /**
   * @param port wanted; the next free one is taken, unless it is `fixed` by the settings
   * @param env for the server, without PORT
   * @param announce called with the address at each readiness after the first, where it has changed
   */
  constructor({ port, fixed, env, announce }) {
    this.port = port;
    this.#fixed = fixed;
    this.#env = env;
    this.#announce = announce;
  }

  get address() {
    return `http://${this.#env.HOST}:${this.port}`;
  }

  /** Resolves when the server answers. */
  async start() {
    const left = readServerMark();
    if (left) await endProcess(left);
    if (existsSync(LOG) && statSync(LOG).size > LOG_LIMIT) renameSync(LOG, `${LOG}.1`);
    for (let attempt = 1; !this.#stopping; attempt += 1) {
      const began = Date.now();
      const ended = await this.#launch();
      if (await this.#becomesReady()) {
        say('server', `ready in ${seconds(began)}`);
        void this.#keep(ended);
        return;
      }
      if (this.#stopping) return;
      if (attempt === FIRST_ATTEMPTS) throw new Halt(`The server does not start. The end of ${LOG}:\n${lastWords()}`);
      say('server', 'ended before it was ready, trying again');
      await wait(1000);
    }
  }

  async stop() {
    this.#stopping = true;
    if (this.#child) await endProcess(mark(this.#child.pid));
  }

  kill() {
    this.#stopping = true;
    this.#child?.kill('SIGKILL');
  }

  /** @returns a promise in an object (a bare one would be awaited) of how the process ends */
  async #launch() {
    await this.#choosePort();
    const log = openSync(LOG, 'a');
    // A group of its own: Ctrl-C reaches this script alone, which then ends things in order.
    const child = spawn(process.execPath, ['-r', './server/bin/typescript-hook.js', 'server/main.ts'], {
      cwd: ROOT,
      env: { ...this.#env, PORT: String(this.port) },
      stdio: ['ignore', log, log],
      detached: true,
    });
    closeSync(log);
    this.#child = child;
    keepServerMark(child.pid, this.address);
    return { how: new Promise((resolve) => child.once('exit', (code, signal) => resolve(signal ?? `code ${code}`))) };
  }

  async #choosePort() {
    if (this.#fixed) {
      if (!(await isFree(this.port))) throw new Halt(`Port ${this.port}, which PORT asks for, is in use. Stop the program that holds it, or set another PORT in .env.`);
      return;
    }
    const free = await freePort(this.port);
    if (free !== this.port) say('server', `port ${this.port} is in use, taking ${free}`);
    this.port = free;
  }

  async #becomesReady() {
    const child = this.#child;
    while (child.exitCode === null && child.signalCode === null) {
      try {
        const { status } = await fetch(`http://127.0.0.1:${this.port}/api/health`, { signal: AbortSignal.timeout(2000) });
        if (status === 200) return true;
      } catch {
        // Not yet; the loop ends when the process does.
      }
      await wait(100);
    }
    return false;
  }

  /** Brings the server back for as long as nobody asks it to stop, each time after a longer pause. */
  async #keep(ended) {
    let pause = 250;
    for (let since = Date.now(); ; ) {
      const how = await ended.how;
      if (this.#stopping) return;
      if (Date.now() - since > SETTLED) pause = 250;
      say('server', `ended unasked (${how}), starting it again`);
      await wait(pause);
      if (this.#stopping) return;
      pause = Math.min(pause * 2, LONGEST_PAUSE);
      const before = this.address;
      since = Date.now();
      try {
        ended = await this.#launch();
      } catch (error) {
        say('server', error.message);
        ended = { how: Promise.resolve('port in use') };
        continue;
      }
      if (!(await this.#becomesReady())) continue;
      say('server', `ready again in ${seconds(since)}`);
      if (this.address !== before) this.#announce(this.address);
    }
  }
}
