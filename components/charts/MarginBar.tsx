import { View } from 'react-native';

import type { Check } from '@/shared/model/check';

export interface MarginBarProps {
  check: Check;
  variant?: 'full' | 'tight' | 'compact';
  stale?: boolean;
}

export const MarginBar = ({ variant = 'full' }: MarginBarProps) => <View style={{ height: variant === 'compact' ? 9 : 15 }} />;
