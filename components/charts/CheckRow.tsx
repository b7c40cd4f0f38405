import { View } from 'react-native';

import { StatusMark } from '@/components/ui/Marks';
import { Text } from '@/components/ui/Text';
import type { Check } from '@/shared/model/check';

import { MarginBar } from './MarginBar';

export interface CheckRowProps {
  check: Check;
  /** Rows of 49 px instead of 73, for a wide screen. */
  tight?: boolean;
  stale?: boolean;
  selected?: boolean;
  onPress?: () => void;
}

export const CheckRow = ({ check, tight, stale }: CheckRowProps) => (
  <View>
    <StatusMark status={check.status} stale={stale} silent />
    <Text strong>{check.title}</Text>
    <MarginBar check={check} variant={tight ? 'tight' : 'full'} stale={stale} />
  </View>
);
