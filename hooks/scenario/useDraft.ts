import { useCallback, useEffect, useMemo, useReducer, useState } from 'react';

import { ApiError, OfflineError } from '@/hooks/api/api-error';
import { errorSentence } from '@/hooks/api/error-sentence';
import type { ScenarioRecord } from '@/shared/contracts/scenario';
import type { Scenario } from '@/shared/model/scenario';

import { differencesBetween, mergeDrafts, type Difference } from './draft-difference';
import { forgetDraft, keepDraft, keptDraft } from './draft-keep';
import { isDirty, reduceDraft, startDraft, type Change, type DraftState } from './draft-state';
import { draftOf, type Draft, type DraftNode } from './draft-tree';
import type { Issues, Reading } from './read-draft';
import { useAutosave } from './useAutosave';
import { useReader, type Reader } from './useReader';

/** How the draft stands towards the server. */
export type SaveState = 'saved' | 'waiting' | 'saving' | 'invalid' | 'offline' | 'conflict' | 'refused';

export interface Conflict {
  by: string;
  at: string;
  differences: readonly Difference[];
  resolve: (takeTheirs: (path: string) => boolean) => void;
}

export interface DraftControls {
  draft: Draft;
  /** The draft as last understood; older than the draft while a field cannot be read. */
  scenario: Scenario;
  issues: Issues;
  /** The last edit has not been read yet: the reader is on its way. */
  pending: boolean;
  reader: Reader | null;
  /** Fetches the reader before the first key is pressed. */
  prepare: () => void;
  readOnly: boolean;
  /** Undefined takes a field or block away; `also` are changes elsewhere in the same undo step. */
  edit: (path: string, value: DraftNode, also?: readonly Change[]) => void;
  undo: (() => void) | null;
  redo: (() => void) | null;
  version: number;
  save: SaveState;
  /** Why the server refused, in plain words. */
  refusal: string | null;
  retrySave: () => void;
  conflict: Conflict | null;
}

const NO_ISSUES: Issues = new Map();

const read = (state: DraftState, reader: Reader | null): Reading | null => {
  if (!isDirty(state)) return { ok: true, scenario: state.saved.scenario };
  return reader?.readDraft(state.present) ?? null;
};

/** The last scenario that could be read, so that the path stays drawn while a field is being typed. */
const useLastGood = (reading: Reading | null, start: Scenario): Scenario => {
  const [last, setLast] = useState(start);
  const current = reading?.ok ? reading.scenario : last;
  if (current !== last) setLast(current);
  return current;
};

const issuesOf = (reading: Reading | null, error: unknown): Issues => {
  if (reading && !reading.ok) return reading.issues;
  if (!(error instanceof ApiError) || error.code !== 'invalid-input') return NO_ISSUES;
  return new Map((error.details.issues ?? []).map((issue) => [issue.path.replace(/^scenario\./, ''), issue.message]));
};

const saveState = (state: DraftState, reading: Reading | null, saving: boolean, error: unknown): SaveState => {
  if (state.theirs) return 'conflict';
  if (!isDirty(state)) return 'saved';
  if (saving) return 'saving';
  if (reading && !reading.ok) return 'invalid';
  if (error instanceof OfflineError) return 'offline';
  return error ? 'refused' : 'waiting';
};

/** Compared as understood, so that `4k7` and 4700 Ω are no difference. */
const conflictOf = (state: DraftState, reading: Reading | null, resolved: (draft: Draft) => void): Conflict | null => {
  if (!state.theirs || !reading) return null;
  const mine = reading.ok ? draftOf(reading.scenario) : state.present;
  const differences = differencesBetween(draftOf(state.saved.scenario), mine, draftOf(state.theirs.scenario));
  return {
    by: state.theirs.updatedBy,
    at: state.theirs.updatedAt,
    differences,
    resolve: (takeTheirs) => resolved(mergeDrafts(state.present, differences, takeTheirs)),
  };
};

/** Keeps unsaved edits in this browser as they are made, and asks before a page with unsent edits is closed. */
const useKeep = (userId: string, scenarioId: string, state: DraftState) => {
  const dirty = isDirty(state);
  useEffect(() => {
    if (!dirty) return forgetDraft(userId, scenarioId);
    keepDraft(userId, scenarioId, { draft: state.present, version: state.saved.version, base: state.saved.scenario });
  }, [dirty, userId, scenarioId, state.present, state.saved]);
  useEffect(() => {
    if (!dirty || !globalThis.addEventListener) return;
    const ask = (event: Event) => event.preventDefault();
    globalThis.addEventListener('beforeunload', ask);
    return () => globalThis.removeEventListener('beforeunload', ask);
  }, [dirty]);
};

/**
 * A scenario being edited: undo and redo, reading what is typed, autosave with the version, edits kept while
 * offline, and another person's version put beside one's own. `record` may be refetched at any time.
 */
export const useDraft = (record: ScenarioRecord, userId: string): DraftControls => {
  const [state, dispatch] = useReducer(reduceDraft, null, () => startDraft(record, record.mayEdit ? keptDraft(userId, record.id) : null));
  const { reader, prepare } = useReader(isDirty(state));
  const reading = useMemo(() => read(state, reader), [state, reader]);
  const scenario = useLastGood(reading, state.saved.scenario);

  useKeep(userId, record.id, state);
  useEffect(() => dispatch({ type: 'changed-elsewhere', record }), [record]);
  const { saving, error, retry } = useAutosave(record.id, state, reading, dispatch);

  const edit = useCallback((path: string, value: DraftNode, also: readonly Change[] = []) => dispatch({ type: 'edit', path, value, also, at: Date.now() }), []);
  const conflict = useMemo(() => conflictOf(state, reading, (draft) => dispatch({ type: 'resolved', draft })), [state, reading]);
  useEffect(() => {
    if (conflict?.differences.length === 0) dispatch({ type: 'resolved', draft: null });
  }, [conflict]);

  const save = saveState(state, reading, saving, error);
  return {
    draft: state.present,
    scenario,
    issues: issuesOf(reading, error),
    pending: reading === null,
    reader,
    prepare,
    readOnly: !record.mayEdit,
    edit,
    undo: state.past.length > 0 ? () => dispatch({ type: 'undo' }) : null,
    redo: state.future.length > 0 ? () => dispatch({ type: 'redo' }) : null,
    version: state.saved.version,
    save,
    refusal: save === 'refused' ? errorSentence(error) : null,
    retrySave: retry,
    conflict,
  };
};
