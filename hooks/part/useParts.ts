import { keepPreviousData, useInfiniteQuery, useQuery } from '@tanstack/react-query';
import type { z } from 'zod';

import { request } from '@/hooks/api/client';
import type { PartRecord, partListSchema } from '@/shared/contracts/part';
import { API } from '@/shared/contracts/routes';
import type { PartKind } from '@/shared/model/part';

type PartList = z.output<typeof partListSchema>;

export interface PartFilter {
  search: string;
  /** Null for every kind. */
  kind: PartKind | null;
}

const listPath = ({ search, kind }: PartFilter, after: string | null) => {
  const query = new URLSearchParams();
  if (search.trim()) query.set('search', search.trim());
  if (kind) query.set('kind', kind);
  if (after) query.set('after', after);
  const text = query.toString();
  return text ? `${API.parts}?${text}` : API.parts;
};

export const useParts = (filter: PartFilter, enabled = true) =>
  useInfiniteQuery({
    queryKey: ['parts', 'list', filter],
    enabled,
    queryFn: ({ pageParam, signal }) => request<PartList>(listPath(filter, pageParam), { signal }),
    initialPageParam: null as string | null,
    getNextPageParam: (last) => last.next,
    placeholderData: keepPreviousData,
    select: (data) => data.pages.flatMap((page) => page.parts),
  });

export const usePart = (id: string) =>
  useQuery({ queryKey: ['parts', 'record', id], queryFn: ({ signal }) => request<PartRecord>(API.part(id), { signal }) });
