import type { Status } from '@/shared/model/check';

import type { SymbolName } from './symbol-name';

export interface StripLine {
  label: string;
  /** Digits as shown; the unit is set in the text face. */
  value: string;
  unit?: string;
}
export interface StripMark {
  /** A status, or stored charge, which is a caution that no check makes. */
  status: Status | 'stored-charge';
  text: string;
}
export interface StripBlock {
  key: string;
  symbol: SymbolName;
  title: string;
  /** Two lines, or three where there is no mark. */
  lines: readonly StripLine[];
  mark?: StripMark;
}
