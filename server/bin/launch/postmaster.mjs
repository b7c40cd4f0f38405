import { readdirSync, readFileSync, readlinkSync, rmSync } from 'node:fs';
import path from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';

import { isAlive } from './processes.mjs';

const worksIn = (pid, folder) => {
  try {
    return readlinkSync(`/proc/${pid}/cwd`) === folder;
  } catch {
    return false;
  }
};

/** @returns number and port of the PostgreSQL that serves this data folder, or null: the file alone proves nothing */
export const runningPostmaster = (data) => {
  let lines;
  try {
    lines = readFileSync(path.join(data, 'postmaster.pid'), 'utf8').split('\n');
  } catch {
    return null;
  }
  const pid = Number(lines[0]);
  return isAlive(pid) && worksIn(pid, data) ? { pid, port: Number(lines[3]) } : null;
};

const processesIn = (data) =>
  readdirSync('/proc')
    .filter((name) => /^\d+$/.test(name) && isAlive(name) && worksIn(name, data))
    .map(Number);

/**
 * Clears what a PostgreSQL that was killed has left: its children, which may still write, and its pid
 * file, whose number may by now belong to a zombie or to another program, so that a start would be refused.
 */
export const clearRemains = async (data) => {
  for (let attempt = 0; processesIn(data).length > 0; attempt += 1) {
    if (attempt >= 50) for (const pid of processesIn(data)) process.kill(pid, 'SIGKILL');
    await wait(100);
  }
  rmSync(path.join(data, 'postmaster.pid'), { force: true });
};
