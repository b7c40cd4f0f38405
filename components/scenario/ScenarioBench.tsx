import { useEffect } from 'react';
import { View } from 'react-native';

import { Button } from '@/components/ui/Button';
import { PageHeader } from '@/components/ui/Page';
import { useLayout } from '@/components/ui/theme';
import type { DraftControls } from '@/hooks/scenario/useDraft';
import type { ScenarioRecord } from '@/shared/contracts/scenario';
import type { Session } from '@/shared/contracts/session';

import { BenchNarrow } from './BenchNarrow';
import { BenchWide } from './BenchWide';
import { EditorProvider } from './editor/editor-context';
import { CheckDialog } from './result/CheckDialog';
import { SaveNotices } from './SaveNotices';
import { saveText } from './save-text';
import { useBench } from './useBench';

/** Ctrl or Cmd with Z undoes, with Shift redoes; a text field keeps its own undo while it has the focus. */
const useUndoKeys = ({ undo, redo }: DraftControls) => {
  useEffect(() => {
    if (typeof document === 'undefined') return;
    const onKey = (event: KeyboardEvent) => {
      const typing = document.activeElement instanceof HTMLInputElement || document.activeElement instanceof HTMLTextAreaElement;
      if (event.key.toLowerCase() !== 'z' || !(event.ctrlKey || event.metaKey) || typing) return;
      event.preventDefault();
      (event.shiftKey ? redo : undo)?.();
    };
    document.addEventListener('keydown', onKey);
    return () => document.removeEventListener('keydown', onKey);
  }, [undo, redo]);
};

const UndoButtons = ({ controls: { undo, redo, readOnly } }: { controls: DraftControls }) => {
  const { wide } = useLayout();
  if (readOnly) return null;
  return (
    <>
      <Button label="Undo" disabled={!undo} onPress={() => undo?.()} />
      {wide ? <Button label="Redo" disabled={!redo} onPress={() => redo?.()} /> : null}
    </>
  );
};

/** A scenario on the bench: path, verdict, checks, plot and fields, for whoever may read or change it. */
export const ScenarioBench = ({ record, session }: { record: ScenarioRecord; session: Session }) => {
  const { wide } = useLayout();
  const bench = useBench(record, session);
  const { controls, check } = bench;
  useUndoKeys(controls);
  const state = controls.readOnly ? 'read only' : saveText(controls.save, controls.issues.size);
  return (
    <EditorProvider value={bench.editor}>
      <View style={{ flex: 1 }}>
        <PageHeader
          title={controls.scenario.name}
          subtitle={`${session.team.name} · draft ${controls.version}, ${state}`}
          back={{ href: '/scenarios', label: 'Back to the scenarios' }}
          actions={<UndoButtons controls={controls} />}
        />
        <SaveNotices controls={controls} />
        {wide ? <BenchWide bench={bench} /> : <BenchNarrow bench={bench} />}
      </View>
      {check ? <CheckDialog key={check.id} check={check} readOnly={controls.readOnly} onClose={bench.closeCheck} onSetAside={(reason) => bench.setAside(check, reason)} /> : null}
    </EditorProvider>
  );
};
