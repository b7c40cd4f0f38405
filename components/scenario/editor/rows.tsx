import { useState, type ReactNode } from 'react';
import { View } from 'react-native';

import { Button } from '@/components/ui/Button';
import { Choice } from '@/components/ui/Choice';
import { InputWindow } from '@/components/ui/InputWindow';
import { LegendBracket } from '@/components/ui/LegendBracket';
import { Text } from '@/components/ui/Text';
import { TextField } from '@/components/ui/TextField';
import { nodeAt } from '@/hooks/scenario/draft-tree';

import { detached } from './detached';
import { useEditor } from './editor-context';

/** A heading with the rows below it. */
export const Section = ({ title, remark, children }: { title: string; remark?: string; children: ReactNode }) => (
  <View style={{ gap: 6 }}>
    <LegendBracket title={title} level={3} {...(remark ? { remark } : {})} />
    {children}
  </View>
);

/** What is wrong with a whole block rather than with one of its fields. */
export const BlockIssue = ({ path }: { path: string }) => {
  const { issues } = useEditor();
  const issue = issues.get(path);
  return issue ? <Text variant="secondary" tone="fail" role="alert">{issue}</Text> : null;
};

export interface PickRowProps<Value extends string> {
  label: string;
  options: readonly { value: Value; label: string }[];
  value: Value;
  onPick: (value: Value) => void;
  hideLabel?: boolean;
}

/** One of a few kinds; the fields below follow it. */
export const PickRow = <Value extends string>({ label, options, value, onPick, hideLabel = false }: PickRowProps<Value>) => {
  const { readOnly } = useEditor();
  return <Choice label={label} options={options} value={value} hideLabel={hideLabel} disabled={readOnly} onChange={(next) => next !== value && onPick(next)} />;
};

/** Words: a name, a note. */
export const WordsRow = ({ path, label, multiline = false, maxLength }: { path: string; label: string; multiline?: boolean; maxLength: number }) => {
  const { draft, edit, issues, readOnly } = useEditor();
  const node = nodeAt(draft, path);
  return <TextField label={label} value={typeof node === 'string' ? node : ''} onChangeText={(text) => edit(path, text)} multiline={multiline} maxLength={maxLength} readOnly={readOnly} error={issues.get(path) ?? null} />;
};

/** A bare number without a unit of its own, such as a coefficient; kept as text while it is no number yet. */
export const CoefficientRow = ({ path, label, remark }: { path: string; label: string; remark: string }) => {
  const { draft, edit, issues, prepare, readOnly } = useEditor();
  const [typed, setTyped] = useState<string | null>(null);
  const node = nodeAt(draft, path);
  const write = (text: string) => {
    setTyped(text);
    const value = Number(text.trim().replace(',', '.').replace('\u2212', '-'));
    edit(path, text.trim() !== '' && Number.isFinite(value) ? value : text, detached(draft, path));
  };
  return (
    <InputWindow label={label} value={typed ?? String(node ?? '')} onChangeText={write} onFocus={prepare} onBlur={() => setTyped(null)} readOnly={readOnly}
      echo={typeof node === 'number' ? `${node} ${remark}` : null} error={issues.has(path) ? `write a number such as 1.13e-3 (${remark})` : null} />
  );
};

/** Adds or takes away a block that the path can do without. */
export const BlockButton = ({ label, onPress }: { label: string; onPress: () => void }) => {
  const { readOnly } = useEditor();
  return readOnly ? null : <View style={{ alignSelf: 'flex-start' }}><Button label={label} onPress={onPress} /></View>;
};
