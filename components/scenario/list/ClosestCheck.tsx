import { View } from 'react-native';

import { marginText } from '@/components/charts/check-figures';
import { MarginBar } from '@/components/charts/MarginBar';
import { Text } from '@/components/ui/Text';
import { STATUS_COLOR } from '@/components/ui/tokens';
import type { ScenarioSummary } from '@/shared/contracts/scenario';

import { CHECK_WORDS } from '../result/check-words';

const sentenceCase = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

/** The check that governs a scenario, as a compact bar with its margin. */
export const ClosestCheck = ({ closest, verdict }: Pick<ScenarioSummary, 'closest' | 'verdict'>) => {
  if (!verdict) return <Text variant="secondary" tone="quiet">being computed</Text>;
  if (!closest) return <Text variant="secondary" tone="quiet">no check applies</Text>;
  return (
    <View style={{ gap: 3 }}>
      <View style={{ flexDirection: 'row', justifyContent: 'space-between', gap: 8 }}>
        <Text variant="label" numberOfLines={1} style={{ flex: 1 }}>{sentenceCase(CHECK_WORDS[closest.id].short)}</Text>
        <Text variant="label" strong tone={STATUS_COLOR[closest.status]}>{marginText(closest) ?? 'no figure'}</Text>
      </View>
      <MarginBar check={closest} variant="compact" silent />
    </View>
  );
};
