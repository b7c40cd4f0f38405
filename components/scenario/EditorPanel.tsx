import { View } from 'react-native';

import { Choice } from '@/components/ui/Choice';
import { Text } from '@/components/ui/Text';
import type { Assessment } from '@/shared/model/result';
import type { Scenario } from '@/shared/model/scenario';

import { BlockCaution } from './Cautions';
import { BulkEditor } from './editor/BulkEditor';
import { ConditionsEditor, LimitsEditor } from './editor/ConditionsEditor';
import { useEditor } from './editor/editor-context';
import { FuseEditor } from './editor/FuseEditor';
import { LimiterEditor } from './editor/LimiterEditor';
import { LoadEditor } from './editor/LoadEditor';
import { RectifierEditor } from './editor/RectifierEditor';
import { SourceEditor } from './editor/SourceEditor';
import type { BlockKey } from './strip-blocks';

/** What the panel shows: the block chosen on the strip, or what holds for the whole path. */
export type Page = 'block' | 'conditions' | 'limits';
const PAGES: readonly { value: Page; label: string }[] = [
  { value: 'block', label: 'Block' },
  { value: 'conditions', label: 'Conditions' },
  { value: 'limits', label: 'Limits' },
];

const BlockEditor = ({ block }: { block: BlockKey }) => {
  switch (block) {
    case 'source':
      return <SourceEditor />;
    case 'fuse':
      return <FuseEditor />;
    case 'limiter.0':
      return <LimiterEditor key="first" index={0} />;
    case 'limiter.1':
      return <LimiterEditor key="second" index={1} />;
    case 'rectifier':
      return <RectifierEditor />;
    case 'bulk':
      return <BulkEditor />;
    case 'load':
      return <LoadEditor />;
  }
};

export interface EditorPanelProps {
  id: string;
  block: BlockKey;
  page: Page;
  onPage: (page: Page) => void;
  scenario: Scenario;
  assessment: Assessment | null;
}

/** The fields of one block, or of conditions and limits, with the caution that belongs there. */
export const EditorPanel = ({ id, block, page, onPage, scenario, assessment }: EditorPanelProps) => {
  const { readOnly } = useEditor();
  return (
    <View nativeID={id} role="tabpanel" aria-label="Figures of the path" style={{ gap: 14 }}>
      <Choice label="Figures of" hideLabel options={PAGES} value={page} onChange={onPage} />
      {readOnly ? <Text variant="secondary" tone="quiet" role="note">Read only: your role reads scenarios. Designers of the team change them.</Text> : null}
      {page === 'block' ? <BlockEditor block={block} /> : null}
      {page === 'conditions' ? <ConditionsEditor /> : null}
      {page === 'limits' ? <LimitsEditor /> : null}
      {page === 'block' ? <BlockCaution block={block} scenario={scenario} assessment={assessment} /> : null}
    </View>
  );
};
