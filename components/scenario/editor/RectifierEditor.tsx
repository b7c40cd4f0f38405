import { View } from 'react-native';

import { Text } from '@/components/ui/Text';
import { nodeAt } from '@/hooks/scenario/draft-tree';

import { useEditor } from './editor-context';
import { QuantityRow } from './QuantityRow';
import { BlockButton, BlockIssue, PickRow, Section } from './rows';

const SurgeRows = () => {
  const { draft, edit } = useEditor();
  const given = nodeAt(draft, 'rectifier.surge') !== undefined;
  return (
    <Section title="Surge rating of one diode">
      {given ? (
        <>
          <QuantityRow path="rectifier.surge.current" />
          <QuantityRow path="rectifier.surge.pulseWidth" />
          <QuantityRow path="rectifier.surge.i2t" />
          <BlockButton label="Take the rating away" onPress={() => edit('rectifier.surge', undefined)} />
        </>
      ) : (
        <>
          <Text variant="secondary" tone="quiet">No figure: the surge of the diodes is not assessed.</Text>
          <BlockButton label="Add a surge rating" onPress={() => edit('rectifier.surge', { current: '', pulseWidth: '10m' })} />
        </>
      )}
    </Section>
  );
};

/** Bridge or, for a DC supply, none. */
export const RectifierEditor = () => {
  const { draft, edit } = useEditor();
  const kind = nodeAt(draft, 'rectifier.kind') === 'bridge' ? 'bridge' : 'none';
  const change = (next: 'bridge' | 'none') => edit('rectifier', next === 'none' ? { kind: 'none' } : { kind: 'bridge', forwardVoltage: '', slopeResistance: '' });
  return (
    <View style={{ gap: 14 }}>
      <Section title="Rectifier">
        <PickRow label="Kind of rectifier" hideLabel options={[{ value: 'bridge', label: 'Full bridge' }, { value: 'none', label: 'None' }]} value={kind} onPick={change} />
        <BlockIssue path="rectifier.kind" />
        {kind === 'bridge' ? (
          <>
            <QuantityRow path="rectifier.forwardVoltage" />
            <QuantityRow path="rectifier.slopeResistance" />
          </>
        ) : (
          <Text variant="secondary" tone="quiet">Current flows both ways.</Text>
        )}
      </Section>
      {kind === 'bridge' ? <SurgeRows /> : null}
    </View>
  );
};
