import { useState } from 'react';
import { View } from 'react-native';

import { Button } from '@/components/ui/Button';
import { Text } from '@/components/ui/Text';
import { listAt, nodeAt, type Draft, type DraftNode } from '@/hooks/scenario/draft-tree';
import type { PartSummary } from '@/shared/contracts/part';

import { BypassEditor } from './BypassEditor';
import { useEditor } from './editor-context';
import { LawEditor } from './LawEditor';
import { PartDialog } from './PartDialog';
import { RatingsEditor } from './RatingsEditor';
import { BlockButton, Section, WordsRow } from './rows';
import { ThermalRows } from './ThermalRows';

const MOST_ELEMENTS = 2;

/** A part without figures yet, for someone who types them. */
const BLANK_PART: DraftNode = {
  kind: 'ntc', name: 'Typed part', maker: '', law: { law: 'b-value', r25: { nominal: '', tolerance: 0 }, b: { nominal: '', tolerance: 0 } },
  thermal: { dissipation: '', timeConstant: '' }, ratings: {},
};

const fromLibrary = ({ id, part }: PartSummary): DraftNode => ({ ...(part as object as Draft), libraryId: id });

const PartHead = ({ base, onChange }: { base: string; onChange: () => void }) => {
  const { draft, readOnly } = useEditor();
  const [name, maker, libraryId] = ['name', 'maker', 'libraryId'].map((key) => nodeAt(draft, `${base}.part.${key}`));
  return (
    <View style={{ flexDirection: 'row', alignItems: 'center', gap: 10 }}>
      <View style={{ flex: 1 }}>
        <Text><Text strong>{String(name ?? '')}</Text> <Text tone="quiet">{String(maker ?? '')}</Text></Text>
        <Text variant="secondary" tone="quiet">{libraryId === undefined ? 'figures typed here' : 'figures from the library'}</Text>
      </View>
      {readOnly ? null : <Button label="Change" spoken="Change the part" onPress={onChange} />}
    </View>
  );
};

const NoLimiter = ({ onChoose }: { onChoose: () => void }) => {
  const { edit } = useEditor();
  return (
    <Section title="Limiter">
      <Text tone="quiet">The path has no limiter: only the source holds the inrush back.</Text>
      <BlockButton label="Choose from the library" onPress={onChoose} />
      <BlockButton label="Type the figures" onPress={() => edit('limiter', [{ part: BLANK_PART }])} />
    </Section>
  );
};

const SecondElement = ({ onAdd }: { onAdd: () => void }) => {
  const { draft } = useEditor();
  if (listAt(draft, 'limiter').length >= MOST_ELEMENTS) return null;
  return <BlockButton label="Add one in series" onPress={onAdd} />;
};

/** One limiter element: the part with its law and ratings, and the contact beside it. */
export const LimiterEditor = ({ index }: { index: number }) => {
  const { draft, edit } = useEditor();
  const [choosingFor, setChoosingFor] = useState<number | null>(null);
  const elements = listAt(draft, 'limiter');
  const base = `limiter.${index}`;
  const [typed, setTyped] = useState(() => nodeAt(draft, `${base}.part.libraryId`) === undefined);
  const choose = (summary: PartSummary) => {
    const part = fromLibrary(summary);
    if (choosingFor === null) return;
    if (choosingFor < elements.length) edit(`limiter.${choosingFor}.part`, part);
    else edit(`limiter.${choosingFor}`, { part });
    setTyped(false);
    setChoosingFor(null);
  };
  const dialog = <PartDialog open={choosingFor !== null} current={nodeAt(draft, `${base}.part.libraryId`)} onClose={() => setChoosingFor(null)} onChoose={choose} />;
  if (elements[index] === undefined)
    return (
      <>
        <NoLimiter onChoose={() => setChoosingFor(0)} />
        {dialog}
      </>
    );
  return (
    <View style={{ gap: 14 }}>
      <Section title={elements.length > 1 ? `Limiter ${index + 1} of ${elements.length}` : 'Limiter'}>
        <PartHead base={base} onChange={() => setChoosingFor(index)} />
        <LawEditor base={`${base}.part`} typed={typed} />
        <ThermalRows base={`${base}.part.thermal`} typed={typed} />
        {typed ? <WordsRow path={`${base}.part.name`} label="Name of the part" maxLength={80} /> : null}
      </Section>
      <BypassEditor base={`${base}.bypass`} />
      <RatingsEditor base={`${base}.part.ratings`} typed={typed} />
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', gap: 8 }}>
        {typed ? null : <BlockButton label="Type the figures" onPress={() => setTyped(true)} />}
        <SecondElement onAdd={() => setChoosingFor(elements.length)} />
        <BlockButton label="Take this one away" onPress={() => edit(base, undefined)} />
      </View>
      {dialog}
    </View>
  );
};
