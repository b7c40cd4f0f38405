import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';

import { ApiError } from '@/hooks/api/api-error';
import { request } from '@/hooks/api/client';
import { SESSION_KEY as KEY } from '@/hooks/api/query-client';
import { API } from '@/shared/contracts/routes';
import type { Session, SignIn } from '@/shared/contracts/session';

/** Null where nobody is signed in. */
const fetchSession = async (): Promise<Session | null> => {
  try {
    return await request<Session>(API.session);
  } catch (error) {
    if (error instanceof ApiError && error.code === 'not-signed-in') return null;
    throw error;
  }
};

/** Who is signed in: undefined while asked, null when nobody is. */
export const useSession = () => useQuery({ queryKey: KEY, queryFn: fetchSession, staleTime: 60_000 });

export const useSignIn = () => {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: (body: SignIn) => request<Session>(API.session, { method: 'POST', body }),
    onSuccess: (session) => queries.setQueryData<Session | null>(KEY, session),
  });
};

export const useSignOut = () => {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: () => request<void>(API.session, { method: 'DELETE' }),
    onSuccess: () => {
      // The session itself stays in the cache: screens watch it, and a removed query tells them nothing.
      queries.removeQueries({ predicate: ({ queryKey }) => queryKey[0] !== KEY[0] });
      queries.setQueryData<Session | null>(KEY, null);
    },
  });
};

/** Whether this person's role lets them make and change scenarios. */
export const useMayDesign = (): boolean => useSession().data?.user.roles.includes('designer') ?? false;
