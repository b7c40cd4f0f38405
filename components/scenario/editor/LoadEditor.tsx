import { View } from 'react-native';

import { Text } from '@/components/ui/Text';
import { nodeAt, type DraftNode } from '@/hooks/scenario/draft-tree';

import { useEditor } from './editor-context';
import { QuantityRow } from './QuantityRow';
import { BlockButton, PickRow, Section } from './rows';

const KINDS = [
  { value: 'constant-power', label: 'Converter' },
  { value: 'resistance', label: 'Resistance' },
  { value: 'none', label: 'None' },
] as const;
type LoadKind = (typeof KINDS)[number]['value'];

const BLANK: Record<LoadKind, DraftNode> = {
  'constant-power': { kind: 'constant-power', power: '', startVoltage: '' },
  resistance: { kind: 'resistance', resistance: '' },
  none: { kind: 'none' },
};

const ConverterRows = () => (
  <>
    <QuantityRow path="load.power" />
    <QuantityRow path="load.startVoltage" />
    <QuantityRow path="load.stopVoltage" />
    <QuantityRow path="load.startDelay" />
    <QuantityRow path="load.rampTime" />
    <Text variant="secondary" tone="quiet">Without a figure it stops at 70 % of the start voltage.</Text>
  </>
);

const FaultRows = () => {
  const { draft, edit } = useEditor();
  const given = nodeAt(draft, 'fault') !== undefined;
  return (
    <Section title="Fault across the bus">
      {given ? (
        <>
          <QuantityRow path="fault.at" />
          <QuantityRow path="fault.resistance" />
          <BlockButton label="Take the fault away" onPress={() => edit('fault', undefined)} />
        </>
      ) : (
        <BlockButton label="Add a fault" onPress={() => edit('fault', { kind: 'resistance', at: '', resistance: '' })} />
      )}
    </Section>
  );
};

/** What the bus feeds, and a fault on it if one is to be tried. */
export const LoadEditor = () => {
  const { draft, edit } = useEditor();
  const node = nodeAt(draft, 'load.kind');
  const kind = KINDS.find(({ value }) => value === node)?.value ?? 'none';
  return (
    <View style={{ gap: 14 }}>
      <Section title="Load">
        <PickRow label="Kind of load" hideLabel options={KINDS} value={kind} onPick={(next) => edit('load', BLANK[next])} />
        {kind === 'constant-power' ? <ConverterRows /> : null}
        {kind === 'resistance' ? <QuantityRow path="load.resistance" /> : null}
      </Section>
      <FaultRows />
    </View>
  );
};
