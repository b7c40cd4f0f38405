import { View } from 'react-native';

import { Text } from '@/components/ui/Text';
import { nodeAt } from '@/hooks/scenario/draft-tree';

import { useEditor } from './editor-context';
import { QuantityRow } from './QuantityRow';
import { BlockButton, Section } from './rows';
import { TolerancedRow } from './TolerancedRow';

/** The capacitor that the inrush charges. */
export const BulkEditor = () => {
  const { draft, edit } = useEditor();
  const cold = nodeAt(draft, 'bulk.atLowAmbient') !== undefined;
  return (
    <View style={{ gap: 14 }}>
      <Section title="Bulk capacitor">
        <TolerancedRow path="bulk.capacitance" />
        <TolerancedRow path="bulk.esr" />
        <QuantityRow path="bulk.bleeder" />
        <QuantityRow path="bulk.initialVoltage" />
      </Section>
      <Section title="At the lowest ambient">
        {cold ? (
          <>
            <QuantityRow path="bulk.atLowAmbient.capacitanceFactor" />
            <QuantityRow path="bulk.atLowAmbient.esrFactor" />
            <BlockButton label="Take these away" onPress={() => edit('bulk.atLowAmbient', undefined)} />
          </>
        ) : (
          <>
            <Text variant="secondary" tone="quiet">Not given: below 0 °C a cold start is at best a caution.</Text>
            <BlockButton label="Add cold factors" onPress={() => edit('bulk.atLowAmbient', { capacitanceFactor: '', esrFactor: '' })} />
          </>
        )}
      </Section>
    </View>
  );
};
