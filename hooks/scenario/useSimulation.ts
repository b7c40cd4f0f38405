import { keepPreviousData, useQuery } from '@tanstack/react-query';
import { useEffect, useState } from 'react';

import { request } from '@/hooks/api/client';
import { API } from '@/shared/contracts/routes';
import type { Simulated } from '@/shared/contracts/simulation';
import type { Scenario } from '@/shared/model/scenario';

/** How long typing must pause before the next run is asked for. */
const PAUSE_MS = 150;
/** Results of earlier edits stay at hand for undo. */
const KEPT_MS = 120_000;

const useSettled = <Value,>(value: Value): Value => {
  const [settled, setSettled] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), PAUSE_MS);
    return () => clearTimeout(timer);
  }, [value]);
  return settled;
};

/** Name and notes change nothing that is computed. */
const computed = (scenario: Scenario): Scenario => ({ ...scenario, name: 'run', notes: '' });

/**
 * The computed result for a scenario. A newer scenario calls the running request off; until its result is
 * there the old one stays and is marked stale.
 */
export const useSimulation = (scenario: Scenario) => {
  const settled = useSettled(scenario);
  const asked = computed(settled);
  const query = useQuery({
    queryKey: ['simulation', JSON.stringify(asked)],
    queryFn: ({ signal }) => request<Simulated>(API.simulations, { method: 'POST', body: { scenario: asked }, signal }),
    placeholderData: keepPreviousData,
    staleTime: Infinity,
    gcTime: KEPT_MS,
  });
  const { data, isPlaceholderData } = query;
  const [lastGood, setLastGood] = useState<Simulated | null>(null);
  if (data && data !== lastGood) setLastGood(data);
  const shown = data ?? lastGood;
  return {
    assessment: shown?.assessment ?? null,
    milliseconds: shown?.milliseconds ?? null,
    stale: settled !== scenario || isPlaceholderData || !data,
    error: query.error,
    retry: () => void query.refetch(),
  };
};
