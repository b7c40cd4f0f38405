import { useCallback, useEffect, useState } from 'react';

import type * as readDraft from './read-draft';

export type Reader = typeof readDraft;

/** Without a connection the script cannot come; it is asked for again at this interval while it is needed. */
const RETRY_MS = 3000;

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
    if (!wanted || reader) return;
    prepare();
    const retry = setInterval(prepare, RETRY_MS);
    return () => clearInterval(retry);
  }, [wanted, reader, prepare]);
  return { reader, prepare };
};
