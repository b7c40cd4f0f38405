import { useEffect, useRef } from 'react';
import type { TextInput } from 'react-native';

import { useEditor } from './editor-context';

/** Takes the focus when the field at this path, or a block that it belongs to, is asked for. */
export const useWantedField = (path: string) => {
  const { wanted, clearWanted } = useEditor();
  const field = useRef<TextInput>(null);
  const mine = wanted !== null && (path === wanted || path.startsWith(`${wanted}.`) || wanted.startsWith(`${path}.`));
  useEffect(() => {
    if (!mine) return;
    field.current?.focus();
    clearWanted();
  }, [mine, clearWanted]);
  return field;
};
