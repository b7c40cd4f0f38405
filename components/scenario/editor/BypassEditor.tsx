import { Text } from '@/components/ui/Text';
import { nodeAt } from '@/hooks/scenario/draft-tree';

import { useEditor } from './editor-context';
import { QuantityRow } from './QuantityRow';
import { BlockButton, PickRow, Section } from './rows';

const BEHAVIOUR = [
  { value: 'works', label: 'Works' },
  { value: 'never-closes', label: 'Never closes' },
  { value: 'welded', label: 'Welded' },
] as const;

/** The contact in parallel with the element, or none. */
export const BypassEditor = ({ base }: { base: string }) => {
  const { draft, edit } = useEditor();
  if (nodeAt(draft, base) === undefined) {
    return (
      <Section title="Bypass contact">
        <Text variant="secondary" tone="quiet">None: the element stays in the path.</Text>
        <BlockButton label="Add a contact" onPress={() => edit(base, { closes: { when: 'time', at: '' }, releaseTime: '', contactResistance: '', behaviour: 'works' })} />
      </Section>
    );
  }
  const byTime = nodeAt(draft, `${base}.closes.when`) === 'time';
  const behaviour = BEHAVIOUR.find(({ value }) => value === nodeAt(draft, `${base}.behaviour`))?.value ?? 'works';
  return (
    <Section title="Bypass contact">
      <PickRow label="Closes" hideLabel options={[{ value: 'time', label: 'After a time' }, { value: 'bus-voltage', label: 'At a bus voltage' }]} value={byTime ? 'time' : 'bus-voltage'} onPick={(when) => edit(`${base}.closes`, when === 'time' ? { when, at: '' } : { when, above: '' })} />
      <QuantityRow path={byTime ? `${base}.closes.at` : `${base}.closes.above`} />
      <QuantityRow path={`${base}.releaseTime`} />
      <QuantityRow path={`${base}.contactResistance`} />
      <QuantityRow path={`${base}.makingCurrent`} />
      <PickRow label="In this run the contact" options={BEHAVIOUR} value={behaviour} onPick={(next) => edit(`${base}.behaviour`, next)} />
      <BlockButton label="Take the contact away" onPress={() => edit(base, undefined)} />
    </Section>
  );
};
