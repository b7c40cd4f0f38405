import type { ReactNode } from 'react';
import { View } from 'react-native';

import { Text } from './Text';
import { useTheme } from './theme';

/** A small engraved plate for a state, such as "before your last edit". */
export const Plate = ({ text, icon }: { text: string; icon?: ReactNode }) => {
  const { colors } = useTheme();
  return (
    <View style={{ flexDirection: 'row', alignItems: 'center', alignSelf: 'flex-start', gap: 7, height: 24, paddingHorizontal: 9, borderWidth: 1.5, borderColor: colors.ink, borderRadius: 3, backgroundColor: colors.panel }}>
      {icon}
      <Text variant="legend" strong numberOfLines={1} style={{ letterSpacing: 0.9, textTransform: 'uppercase' }}>{text}</Text>
    </View>
  );
};
