import { View } from 'react-native';

import type { Status } from '@/shared/model/check';

import type { SymbolName } from './symbol-name';

export interface StripLine {
  label: string;
  /** Digits as shown; the unit is set in the text face. */
  value: string;
  unit?: string;
}
export interface StripBlock {
  key: string;
  symbol: SymbolName;
  title: string;
  /** Two lines, or three where there is no mark. */
  lines: readonly StripLine[];
  mark?: { status: Status | 'stored-charge'; text: string };
}
export interface PathStripProps {
  blocks: readonly StripBlock[];
  selected: string;
  onSelect: (key: string) => void;
  stale?: boolean;
  /** id of the panel that the tabs steer, for a screen reader. */
  controls?: string;
}

export const PathStrip = (_: PathStripProps) => <View style={{ height: 148 }} />;
