import { keepPreviousData, useInfiniteQuery, useMutation, useQuery, useQueryClient, type QueryClient } from '@tanstack/react-query';
import type { z } from 'zod';

import { request } from '@/hooks/api/client';
import { API } from '@/shared/contracts/routes';
import type { ScenarioRecord, scenarioListSchema } from '@/shared/contracts/scenario';
import type { Scenario, ScenarioInput } from '@/shared/model/scenario';

type ScenarioList = z.output<typeof scenarioListSchema>;

/** A saved draft gets its verdict in the background; until then the list asks again. */
const VERDICT_EVERY_MS = 1500;

const LISTS = ['scenarios', 'list'] as const;
const recordKey = (id: string) => ['scenarios', 'record', id] as const;

const listPath = (search: string, after: string | null) => {
  const query = new URLSearchParams();
  if (search.trim()) query.set('search', search.trim());
  if (after) query.set('after', after);
  const text = query.toString();
  return text ? `${API.scenarios}?${text}` : API.scenarios;
};

/** All scenarios of the team, last changed first, page by page. */
export const useScenarios = (search: string) =>
  useInfiniteQuery({
    queryKey: [...LISTS, search.trim()],
    queryFn: ({ pageParam, signal }) => request<ScenarioList>(listPath(search, pageParam), { signal }),
    initialPageParam: null as string | null,
    getNextPageParam: (last) => last.next,
    placeholderData: keepPreviousData,
    refetchInterval: ({ state }) => (state.data?.pages.some((page) => page.scenarios.some(({ verdict }) => !verdict)) ? VERDICT_EVERY_MS : false),
    select: (data) => data.pages.flatMap((page) => page.scenarios),
  });

export const useScenario = (id: string) =>
  useQuery({ queryKey: recordKey(id), queryFn: ({ signal }) => request<ScenarioRecord>(API.scenario(id), { signal }) });

const remember = (queries: QueryClient, record: ScenarioRecord) => {
  queries.setQueryData(recordKey(record.id), record);
  void queries.invalidateQueries({ queryKey: LISTS });
};

export const useSaveScenario = (id: string) => {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: (body: { version: number; scenario: Scenario }) => request<ScenarioRecord>(API.scenario(id), { method: 'PUT', body }),
    onSuccess: (record) => remember(queries, record),
  });
};

/** The client picks the id, so that a repeated request makes one scenario, not two. */
export const useCreateScenario = () => {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: (body: { id: string; scenario: ScenarioInput }) => request<ScenarioRecord>(API.scenarios, { method: 'POST', body }),
    onSuccess: (record) => remember(queries, record),
  });
};

export const useDeleteScenario = () => {
  const queries = useQueryClient();
  return useMutation({
    mutationFn: (id: string) => request<void>(API.scenario(id), { method: 'DELETE' }),
    onSuccess: (_, id) => {
      queries.removeQueries({ queryKey: recordKey(id) });
      return queries.invalidateQueries({ queryKey: LISTS });
    },
  });
};
