import { View } from 'react-native';

import type { Envelope, RunEvent, Stopped, Traces } from '@/shared/model/result';

export interface RatingLine {
  /** SI */
  value: number;
  label: string;
}
export interface SplitTimePlotProps {
  traces: Traces;
  envelope: Envelope | null;
  events: readonly RunEvent[];
  ratings: { current?: RatingLine; temperature?: RatingLine; energy?: RatingLine };
  elementNames: readonly string[];
  /** Which limiter element the lower two lanes show; the first when absent. */
  element?: number;
  stale?: boolean;
  /** Why the run ended early: drawn as a red edge where the traces stop. */
  stopped?: Stopped | null;
  width: number;
  height: number;
}

export const SplitTimePlot = ({ width, height }: SplitTimePlotProps) => <View style={{ width, height }} />;
