import type { ReactNode } from 'react';
import { View } from 'react-native';

import { Text } from './Text';
import { useTheme } from './theme';

export interface LegendBracketProps {
  title: string;
  remark?: ReactNode;
  level?: 2 | 3;
}

/** Heads a section in place of a card: a thin line that drops at both ends, with the title set into it. */
export const LegendBracket = ({ title, remark, level = 2 }: LegendBracketProps) => {
  const { colors } = useTheme();
  const line = { height: 7, borderTopWidth: 1, borderColor: colors.ink } as const;
  return (
    <View style={{ flexDirection: 'row', alignItems: 'flex-end', gap: 8, minHeight: 20 }}>
      <View style={[line, { width: 10, borderLeftWidth: 1 }]} />
      <Text variant="legend" strong heading={level} style={{ letterSpacing: 0.9, textTransform: 'uppercase', lineHeight: 14 }}>{title}</Text>
      {typeof remark === 'string' ? <Text variant="secondary" tone="quiet" style={{ lineHeight: 15, flexShrink: 1 }}>{remark}</Text> : remark}
      <View style={[line, { flex: 1, minWidth: 10, borderRightWidth: 1 }]} />
    </View>
  );
};
