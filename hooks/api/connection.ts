import { useSyncExternalStore } from 'react';

/** Since when no answer came, ms since 1970; null while answers come. */
let lostSince: number | null = null;
const listeners = new Set<() => void>();

const move = (next: number | null) => {
  if ((lostSince === null) === (next === null)) return;
  lostSince = next;
  listeners.forEach((listener) => listener());
};

/** Told by the client after each request, so that every part of the screen agrees on being connected. */
export const connection = {
  lost: () => move(Date.now()),
  answered: () => move(null),
  lostSince: () => lostSince,
};

const subscribe = (listener: () => void) => {
  listeners.add(listener);
  return () => {
    listeners.delete(listener);
  };
};

/** Since when the server has not answered (ms since 1970), or null. */
export const useLostSince = (): number | null => useSyncExternalStore(subscribe, connection.lostSince, () => null);
