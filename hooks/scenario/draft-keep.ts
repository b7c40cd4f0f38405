import type { Scenario } from '@/shared/model/scenario';

import type { Draft } from './draft-tree';

/** Unsaved edits, kept in this browser so that neither leaving nor reloading nor a lost connection loses them. */
export interface KeptDraft {
  draft: Draft;
  /** The server's version that the edits were made on. */
  version: number;
  base: Scenario;
}

const nameOf = (userId: string, scenarioId: string) => `tidegate.draft.${userId}.${scenarioId}`;
const store = (): Storage | undefined => globalThis.localStorage;

export const keepDraft = (userId: string, scenarioId: string, kept: KeptDraft) => {
  try {
    store()?.setItem(nameOf(userId, scenarioId), JSON.stringify(kept));
  } catch {
    // A full or forbidden store: the edits stay in the page, and leaving asks first.
  }
};

export const keptDraft = (userId: string, scenarioId: string): KeptDraft | null => {
  const text = store()?.getItem(nameOf(userId, scenarioId));
  return text ? (JSON.parse(text) as KeptDraft) : null;
};

export const forgetDraft = (userId: string, scenarioId: string) => store()?.removeItem(nameOf(userId, scenarioId));
