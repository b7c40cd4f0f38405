import { useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';

import { askHealth } from './client';
import { useLostSince } from './connection';

const ASK_EVERY_MS = 4000;

/** While the server is away, asks again at intervals and when the browser says that it is back; then everything shown is refreshed. */
export const useReconnect = () => {
  const lost = useLostSince() !== null;
  const queries = useQueryClient();
  useEffect(() => {
    if (!lost) return;
    const ask = () => void askHealth();
    const timer = setInterval(ask, ASK_EVERY_MS);
    globalThis.addEventListener?.('online', ask);
    return () => {
      clearInterval(timer);
      globalThis.removeEventListener?.('online', ask);
      void queries.invalidateQueries();
    };
  }, [lost, queries]);
};
