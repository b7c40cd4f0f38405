import { useCallback, useEffect, useState } from 'react';

import type * as readDraft from './read-draft';

export type Reader = typeof readDraft;

let loaded: Reader | null = null;
let loading: Promise<Reader> | null = null;

const load = (): Promise<Reader> => {
  loading ??= import('./read-draft').then(async (reader) => {
    await reader.loadUnits();
    return (loaded = reader);
  });
  loading.catch(() => (loading = null));
  return loading;
};

/**
 * The reader of typed quantities, with the unit library and the schema behind it: large, so it comes
 * with the first field that is entered and not with the page.
 */
export const useReader = (wanted: boolean): { reader: Reader | null; prepare: () => void } => {
  const [reader, setReader] = useState(loaded);
  const prepare = useCallback(() => {
    load().then(setReader, () => undefined);
  }, []);
  useEffect(() => {
    if (wanted && !reader) prepare();
  }, [wanted, reader, prepare]);
  return { reader, prepare };
};
