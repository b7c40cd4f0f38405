import { linkSync, readFileSync, rmSync, writeFileSync } from 'node:fs';

import { local } from './paths.mjs';
import { mark, stillRuns } from './processes.mjs';
import { Halt, say } from './say.mjs';

const read = (file) => {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return null;
  }
};

/**
 * One start at a time. The file holds the number of the process and when that began, since a number alone
 * may belong to another program by the time that it is looked at.
 *
 * @returns null when it is ours now, else the process that holds it
 */
export const takeLock = () => {
  const lock = local('start.lock');
  const own = `${lock}.${process.pid}`;
  try {
    writeFileSync(own, JSON.stringify(mark(process.pid)));
  } catch (error) {
    throw new Halt(`Cannot write in .local (${error.code}): it belongs to another user. Start as that user, or remove the folder to begin anew.`);
  }
  try {
    for (;;) {
      try {
        linkSync(own, lock);
        return null;
      } catch (error) {
        if (error.code !== 'EEXIST') throw error;
      }
      const holder = read(lock);
      if (stillRuns(holder)) return holder;
      say('start', 'removing the lock that an earlier start has left');
      rmSync(lock, { force: true });
    }
  } finally {
    rmSync(own, { force: true });
  }
};

export const releaseLock = () => {
  if (read(local('start.lock'))?.pid === process.pid) rmSync(local('start.lock'), { force: true });
};

/** The server that was started last: an earlier start that was killed could not end it. */
export const readServerMark = () => read(local('server.json'));
export const keepServerMark = (pid, address) => writeFileSync(local('server.json'), JSON.stringify({ ...mark(pid), address }));
