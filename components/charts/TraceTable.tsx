import { View } from 'react-native';

import type { Traces } from '@/shared/model/result';

export interface TraceTableProps {
  traces: Traces;
  elementNames: readonly string[];
  element?: number;
}

/** The table behind the plot. */
export const TraceTable = (_: TraceTableProps) => <View />;
