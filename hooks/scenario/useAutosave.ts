import { useEffect, useRef, useState, type Dispatch } from 'react';

import { ApiError, OfflineError } from '@/hooks/api/api-error';
import { useLostSince } from '@/hooks/api/connection';
import type { ScenarioRecord } from '@/shared/contracts/scenario';
import type { Scenario } from '@/shared/model/scenario';

import { isDirty, type DraftAction, type DraftState } from './draft-state';
import type { Draft } from './draft-tree';
import type { Reading } from './read-draft';
import { useSaveScenario } from './useScenarios';

/** How long typing must pause before the draft goes to the server. */
const PAUSE_MS = 2000;

interface Failure {
  error: Error;
  /** The draft that was refused; another edit may try again. */
  draft: Draft;
}

/** Saves a readable, changed draft after a pause, with the version it was made on; waits while the server is away. */
export const useAutosave = (id: string, state: DraftState, reading: Reading | null, dispatch: Dispatch<DraftAction>) => {
  const { mutate, isPending } = useSaveScenario(id);
  const [failure, setFailure] = useState<Failure | null>(null);
  const away = useLostSince() !== null;
  const { present, theirs } = state;
  const { version } = state.saved;
  const scenario = isDirty(state) && reading?.ok ? reading.scenario : null;
  const refused = failure !== null && failure.draft === present && !(failure.error instanceof OfflineError);
  const ready = scenario !== null && !theirs && !isPending && !away && !refused;

  const flush = useRef<(() => void) | null>(null);
  // Leaving the screen within the pause saves at once. Stands before the timer's effect, whose clean-up forgets what to send.
  useEffect(() => () => flush.current?.(), []);

  useEffect(() => {
    if (!ready || !scenario) return;
    const send = (sent: Draft, body: { version: number; scenario: Scenario }) =>
      mutate(body, {
        onSuccess: (record) => {
          setFailure(null);
          dispatch({ type: 'saved', sent, record });
        },
        onError: (error) => {
          setFailure({ error, draft: sent });
          if (error instanceof ApiError && error.code === 'version-conflict')
            dispatch({ type: 'changed-elsewhere', record: error.details.conflict as ScenarioRecord });
        },
      });
    flush.current = () => send(present, { version, scenario });
    const timer = setTimeout(flush.current, PAUSE_MS);
    return () => {
      clearTimeout(timer);
      flush.current = null;
    };
  }, [ready, scenario, present, version, mutate, dispatch]);

  const error = away ? new OfflineError('no answer from the server') : failure?.draft === present ? failure.error : null;
  return { saving: isPending, error, retry: () => setFailure(null) };
};
