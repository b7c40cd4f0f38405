import { createContext, useContext } from 'react';

import type { DraftControls } from '@/hooks/scenario/useDraft';

export interface Editor extends Pick<DraftControls, 'draft' | 'scenario' | 'issues' | 'reader' | 'prepare' | 'readOnly' | 'edit'> {
  /** A field that is to be looked at, such as the one where a run stopped; the first field at or below it takes the focus. */
  wanted: string | null;
  clearWanted: () => void;
}

const EditorContext = createContext<Editor | null>(null);
export const EditorProvider = EditorContext.Provider;

/** The draft that the fields around here belong to. */
export const useEditor = (): Editor => {
  const editor = useContext(EditorContext);
  if (!editor) throw new Error('useEditor needs an EditorProvider above it');
  return editor;
};
