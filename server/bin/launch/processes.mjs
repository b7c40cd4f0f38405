import { readFileSync } from 'node:fs';
import { setTimeout as wait } from 'node:timers/promises';

const statOf = (pid) => {
  const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
  // The name in brackets may hold spaces; what follows it is plain.
  const [state, ...rest] = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
  return { state, began: rest[18] };
};

/** @returns what tells this process from a later one with the same number; null where it is gone, or a zombie */
export const beganAt = (pid) => {
  try {
    const { state, began } = statOf(pid);
    return state === 'Z' || state === 'X' ? null : began;
  } catch {
    return null;
  }
};

export const isAlive = (pid) => beganAt(pid) !== null;

export const mark = (pid) => ({ pid, began: beganAt(pid) });

/** Whether the very process that was marked still runs. */
export const stillRuns = (marked) => Boolean(marked?.began) && beganAt(marked.pid) === marked.began;

/** Asks first, insists after `patience` milliseconds. */
export const endProcess = async (marked, patience = 8000) => {
  const signalTo = (signal) => {
    if (!stillRuns(marked)) return;
    try {
      process.kill(marked.pid, signal);
    } catch (error) {
      if (error.code !== 'ESRCH') throw error;
    }
  };
  signalTo('SIGTERM');
  for (const until = Date.now() + patience; stillRuns(marked) && Date.now() < until; ) await wait(50);
  signalTo('SIGKILL');
  for (const until = Date.now() + 2000; stillRuns(marked) && Date.now() < until; ) await wait(50);
};
