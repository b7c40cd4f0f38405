import { View } from 'react-native';

import { Text } from '@/components/ui/Text';

import { QuantityRow } from './QuantityRow';
import { Section, WordsRow } from './rows';
import { TolerancedRow } from './TolerancedRow';

/** Where and how long: what holds for the whole path. */
export const ConditionsEditor = () => (
  <View style={{ gap: 14 }}>
    <Section title="Conditions">
      <TolerancedRow path="ambient" alwaysEnds ends={['Lowest ambient', 'Highest ambient']} />
      <Text variant="secondary" tone="quiet">At the part, cabinet rise included.</Text>
      <QuantityRow path="duration" />
    </Section>
    <Section title="This scenario">
      <WordsRow path="name" label="Name" maxLength={120} />
      <WordsRow path="notes" label="Notes" multiline maxLength={4000} />
    </Section>
  </View>
);

/** What the person asks of the design. */
export const LimitsEditor = () => (
  <Section title="Limits" remark="an absent one is not assessed">
    <QuantityRow path="limits.peakCurrent" />
    <QuantityRow path="limits.limiterLoss" />
    <QuantityRow path="limits.timeToTrip" />
    <QuantityRow path="limits.voltageDrop" />
    <QuantityRow path="limits.steadyCurrent" />
    <QuantityRow path="cautionBelow" />
  </Section>
);
