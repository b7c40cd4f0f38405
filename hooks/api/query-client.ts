import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query';

import type { Session } from '@/shared/contracts/session';

import { ApiError } from './api-error';

/** Who is signed in; null once nobody is. */
export const SESSION_KEY = ['session'] as const;

const MAY_PASS = ['busy', 'database-unavailable'];
const ATTEMPTS = 3;

/** Only what may pass by itself is asked again; a refusal stays one. */
const mayPass = (failures: number, error: Error) => failures < ATTEMPTS && error instanceof ApiError && MAY_PASS.includes(error.code);

/** The cache of what the server answered. Requests are tried even where the browser thinks that it is offline: it is often wrong. */
export const makeQueryClient = (): QueryClient => {
  /** A session that ended on the server ends here too: the guard asks to sign in again and comes back to this place. */
  const onError = (error: Error) => {
    if (error instanceof ApiError && error.code === 'not-signed-in') client.setQueryData<Session | null>(SESSION_KEY, null);
  };
  const client = new QueryClient({
    queryCache: new QueryCache({ onError }),
    mutationCache: new MutationCache({ onError }),
    defaultOptions: {
      queries: { networkMode: 'always', retry: mayPass, staleTime: 15_000 },
      mutations: { networkMode: 'always', retry: false },
    },
  });
  return client;
};
