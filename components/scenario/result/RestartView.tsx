import { View } from 'react-native';

import { Quantity } from '@/components/ui/Quantity';
import { Text } from '@/components/ui/Text';
import { useTheme } from '@/components/ui/theme';
import type { Check } from '@/shared/model/check';
import type { RestartCurve } from '@/shared/model/result';

import { RestartPlot } from './RestartPlot';

const Fact = ({ label, value, text }: { label: string; value: number | null; text: string }) => {
  const { colors } = useTheme();
  return (
    <View style={{ flexBasis: 150, flexGrow: 1, borderTopWidth: 1, borderTopColor: colors.rule2, paddingVertical: 6 }}>
      <Text variant="secondary" tone="quiet">{label}</Text>
      {value === null ? <Text variant="label">{text}</Text> : <Quantity value={value} dimension="time" significant={3} strong />}
    </View>
  );
};

export interface RestartViewProps {
  restart: RestartCurve;
  check: Check | undefined;
  width: number;
  height: number;
}

/** Peak current against the time without power: the worst of it need not be the longest or the shortest. */
export const RestartView = ({ restart, check, width, height }: RestartViewProps) => (
  <View style={{ gap: 10 }}>
    <RestartPlot restart={restart} limit={check?.rating ?? null} width={width} height={height} />
    <View style={{ flexDirection: 'row', flexWrap: 'wrap', columnGap: 12 }}>
      <Fact label="worst time off" value={restart.worstOffTime} text="" />
      <Fact label="dips within rating up to" value={restart.shortDipsWithin} text="no such dip" />
      <Fact label="within rating again from" value={restart.withinAfter} text="at no time off tried" />
    </View>
  </View>
);
