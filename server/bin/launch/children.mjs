import { spawn } from 'node:child_process';
import { openSync, closeSync } from 'node:fs';

const running = new Set();

/**
 * Runs a command to its end; with a `log` its output goes there.
 * It runs in a group of its own, so that it can be ended with all that it started.
 *
 * @returns its exit code; a signal counts as failure
 */
export const runChild = (command, args, { log, ...options } = {}) =>
  new Promise((resolve, reject) => {
    const output = log ? openSync(log, 'w') : null;
    const child = spawn(command, args, { stdio: output === null ? 'inherit' : ['ignore', output, output], ...options, detached: true });
    if (output !== null) closeSync(output);
    running.add(child);
    child.once('error', reject);
    child.once('exit', (code) => {
      running.delete(child);
      resolve(code ?? 1);
    });
  });

export const endChildren = () => {
  for (const child of running) {
    try {
      process.kill(-child.pid, 'SIGTERM');
    } catch (error) {
      if (error.code !== 'ESRCH') throw error;
    }
  }
};
