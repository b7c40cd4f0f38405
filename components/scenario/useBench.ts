import { useCallback, useMemo, useState } from 'react';

import { useDraft } from '@/hooks/scenario/useDraft';
import { useSimulation } from '@/hooks/scenario/useSimulation';
import type { ScenarioRecord } from '@/shared/contracts/scenario';
import type { Session } from '@/shared/contracts/session';
import type { Check } from '@/shared/model/check';

import type { Editor } from './editor/editor-context';
import type { Page } from './EditorPanel';
import { placeOfPath } from './place-of-path';
import { stripBlocks, type BlockKey } from './strip-blocks';

/** Everything that the wide and the narrow layout of a scenario share: the draft, its result, and where one is. */
export const useBench = (record: ScenarioRecord, session: Session) => {
  const controls = useDraft(record, session.user.id);
  const { scenario, draft, issues, reader, prepare, readOnly, edit } = controls;
  const run = useSimulation(scenario);
  const [chosen, setChosen] = useState<BlockKey>('limiter.0');
  const [page, setPage] = useState<Page>('block');
  const [wanted, setWanted] = useState<string | null>(null);
  const [opened, setOpened] = useState<Pick<Check, 'id' | 'element'> | null>(null);
  const clearWanted = useCallback(() => setWanted(null), []);

  const blocks = useMemo(() => stripBlocks(scenario, run.assessment), [scenario, run.assessment]);
  const block = blocks.some(({ key }) => key === chosen) ? chosen : 'limiter.0';
  const editor: Editor = { draft, scenario, issues, reader, prepare, readOnly, edit, wanted, clearWanted };
  const check = run.assessment?.checks.find(({ id, element }) => id === opened?.id && element === opened.element) ?? null;

  const select = (key: string) => {
    setChosen(key as BlockKey);
    setPage('block');
  };
  const goTo = (path: string) => {
    const place = placeOfPath(path);
    setPage(place.page);
    if (place.page === 'block') setChosen(place.block);
    setWanted(path);
  };
  const setAside = (of: Check, reason: string | null) => {
    const others = scenario.setAside.filter(({ check: id }) => id !== of.id);
    edit('setAside', reason === null ? others : [...others, { check: of.id, reason }]);
    setOpened(null);
  };
  /** An edit that is not read yet, or cannot be, leaves the result behind as well. */
  const stale = run.stale || controls.pending || issues.size > 0;
  return { controls, run, stale, blocks, block, page, setPage, editor, check, openCheck: setOpened, closeCheck: () => setOpened(null), select, goTo, setAside };
};
export type Bench = ReturnType<typeof useBench>;
