import type { ScenarioRecord } from '@/shared/contracts/scenario';
import type { Scenario } from '@/shared/model/scenario';

import type { KeptDraft } from './draft-keep';
import { draftOf, withNode, type Draft, type DraftNode } from './draft-tree';

export const UNDO_STEPS = 50;
/** Typing on in the same field within this time belongs to the same step. */
const SAME_STEP_MS = 1500;

export interface DraftState {
  past: readonly Draft[];
  present: Draft;
  future: readonly Draft[];
  /** Where and when the last edit was, so that a word is undone at once and not letter by letter. */
  lastEdit: { path: string; at: number } | null;
  /** What the server holds, as far as we know. */
  saved: { draft: Draft; scenario: Scenario; version: number };
  /** Someone else's version that came while there were unsaved edits here. */
  theirs: ScenarioRecord | null;
}

export type Change = readonly [path: string, value: DraftNode];

export type DraftAction =
  /** `also` are values elsewhere that change in the same step. */
  | { type: 'edit'; path: string; value: DraftNode; also?: readonly Change[]; at: number }
  | { type: 'undo' }
  | { type: 'redo' }
  | { type: 'saved'; sent: Draft; record: ScenarioRecord }
  | { type: 'changed-elsewhere'; record: ScenarioRecord }
  /** Null where the two turned out to say the same. */
  | { type: 'resolved'; draft: Draft | null };

const savedOf = (record: ScenarioRecord, draft = draftOf(record.scenario)) => ({ draft, scenario: record.scenario, version: record.version });

export const isDirty = (state: DraftState) => state.present !== state.saved.draft;

/**
 * A draft begins as the server's record. Edits that an earlier visit left behind are put on top, as one step;
 * if the record has moved on since, both stand beside each other until the person chooses.
 */
export const startDraft = (record: ScenarioRecord, kept: KeptDraft | null = null): DraftState => {
  const saved = kept ? { draft: draftOf(kept.base), scenario: kept.base, version: kept.version } : savedOf(record);
  const theirs = kept && record.version > kept.version ? record : null;
  return { past: kept ? [saved.draft] : [], present: kept?.draft ?? saved.draft, future: [], lastEdit: null, saved, theirs };
};

const step = (state: DraftState, present: Draft): DraftState => ({
  ...state,
  past: [...state.past, state.present].slice(-UNDO_STEPS),
  present,
  future: [],
});

const edit = (state: DraftState, { path, value, also = [], at }: Extract<DraftAction, { type: 'edit' }>): DraftState => {
  const changes: readonly Change[] = [[path, value], ...also];
  const present = changes.reduce((draft, [where, what]) => withNode(draft, where, what), state.present);
  const sameStep = state.lastEdit?.path === path && at - state.lastEdit.at < SAME_STEP_MS && state.past.length > 0;
  const next = sameStep ? { ...state, present, future: [] } : step(state, present);
  return { ...next, lastEdit: { path, at } };
};

const undo = (state: DraftState): DraftState => {
  const present = state.past.at(-1);
  if (!present) return state;
  return { ...state, past: state.past.slice(0, -1), present, future: [state.present, ...state.future], lastEdit: null };
};

const redo = (state: DraftState): DraftState => {
  const [present, ...future] = state.future;
  if (!present) return state;
  return { ...state, past: [...state.past, state.present], present, future, lastEdit: null };
};

const takeTheirs = (state: DraftState, record: ScenarioRecord): DraftState => {
  if (record.version <= state.saved.version) return state;
  return isDirty(state) ? { ...state, theirs: record } : startDraft(record);
};

const resolve = (state: DraftState, draft: Draft | null): DraftState => {
  if (!state.theirs) return state;
  if (!draft) return startDraft(state.theirs);
  return { ...step(state, draft), saved: savedOf(state.theirs), theirs: null };
};

export const reduceDraft = (state: DraftState, action: DraftAction): DraftState => {
  switch (action.type) {
    case 'edit':
      return edit(state, action);
    case 'undo':
      return undo(state);
    case 'redo':
      return redo(state);
    case 'saved':
      return { ...state, saved: savedOf(action.record, action.sent) };
    case 'changed-elsewhere':
      return takeTheirs(state, action.record);
    case 'resolved':
      return resolve(state, action.draft);
  }
};
