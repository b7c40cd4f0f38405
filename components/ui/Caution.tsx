import type { ReactNode } from 'react';
import { View } from 'react-native';

import { StatusMark } from './Marks';
import { Text } from './Text';
import { useTheme } from './theme';

/** Stands once beside what can hurt: mains, stored charge, heat. */
export const Caution = ({ title, children }: { title: string; children: ReactNode }) => {
  const { colors } = useTheme();
  return (
    <View role="note" style={{ flexDirection: 'row', gap: 8, paddingVertical: 8, paddingHorizontal: 10, borderLeftWidth: 3, borderLeftColor: colors.caution, backgroundColor: colors.panel }}>
      <StatusMark status="caution" silent />
      <Text variant="secondary" style={{ flex: 1, fontSize: 13.5 }}>
        <Text variant="secondary" strong tone="caution" style={{ fontSize: 13.5 }}>{title}. </Text>
        {children}
      </Text>
    </View>
  );
};
