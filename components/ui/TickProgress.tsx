import { View } from 'react-native';

import { Button } from './Button';
import { Text } from './Text';
import { useTheme } from './theme';

export interface TickProgressProps {
  /** Such as "Computing corner 9 of 24". */
  label: string;
  done: number;
  /** Number of ticks, one for each step of the work. */
  total: number;
  onCancel?: () => void;
}

/** Long work as a row of ticks that fill: how far, and a way out. */
export const TickProgress = ({ label, done, total, onCancel }: TickProgressProps) => {
  const { colors } = useTheme();
  return (
    <View style={{ gap: 8, alignItems: 'flex-start' }}>
      <Text strong role="status">{label}</Text>
      <View accessible role="progressbar" aria-label={label} aria-valuemin={0} aria-valuemax={total} aria-valuenow={done} style={{ flexDirection: 'row', alignItems: 'flex-end', gap: 2, height: 14, width: '100%', maxWidth: total * 12 }}>
        {Array.from({ length: total }, (_, index) => (
          <View key={index} style={{ flex: 1, height: index < done ? 14 : index % 12 === 0 ? 10 : 6, backgroundColor: index < done ? colors.ink : colors.rule2 }} />
        ))}
      </View>
      {onCancel ? <Button label="Cancel" kind="quiet" onPress={onCancel} /> : null}
    </View>
  );
};
