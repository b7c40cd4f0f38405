import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';

import { request } from '@/hooks/api/client';
import { API } from '@/shared/contracts/routes';
import type { createdTokenSchema, createTokenSchema, tokenListSchema } from '@/shared/contracts/session';

const KEY = ['tokens'] as const;
type TokenList = z.output<typeof tokenListSchema>;
export type Token = TokenList['tokens'][number];
export type CreatedToken = z.output<typeof createdTokenSchema>;

export const useTokens = () =>
  useQuery({ queryKey: KEY, queryFn: ({ signal }) => request<TokenList>(API.tokens, { signal }) });

export const useCreateToken = () => {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: (body: z.input<typeof createTokenSchema>) => request<CreatedToken>(API.tokens, { method: 'POST', body }),
    onSuccess: () => queries.invalidateQueries({ queryKey: KEY }),
  });
};

export const useRevokeToken = () => {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: (id: string) => request<void>(API.token(id), { method: 'DELETE' }),
    onSuccess: () => queries.invalidateQueries({ queryKey: KEY }),
  });
};
