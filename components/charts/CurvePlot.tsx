import { View } from 'react-native';

import type { ColorName } from '@/components/ui/tokens';

export interface CurvePlotProps {
  /** Spoken name of the plot. */
  title: string;
  x: { label: string; values: readonly number[]; domain?: [number, number] };
  /** Displayed units; `log` needs values above zero. */
  y: { label: string; scale: 'linear' | 'log'; domain?: [number, number] };
  line: readonly number[];
  band?: { low: readonly number[]; high: readonly number[] };
  points?: readonly { x: number; y: number }[];
  callout?: { x: number; y: number; title: string; text?: string };
  /** Vertical line, such as the highest body temperature. */
  ratingAt?: { x: number; label: string };
  tone?: ColorName;
  width: number;
  height: number;
}

export const CurvePlot = ({ width, height }: CurvePlotProps) => <View style={{ width, height }} />;
