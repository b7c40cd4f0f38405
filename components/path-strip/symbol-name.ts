export const SYMBOL_NAMES = [
  'ac-source', 'dc-source', 'fuse', 'ntc', 'ptc', 'resistor', 'ntc-contact', 'ptc-contact', 'resistor-contact',
  'bridge', 'capacitor', 'converter', 'resistive-load', 'no-load', 'wire',
] as const;
/** `wire` stands for a block that the path does without (no fuse, no limiter, no bridge). */
export type SymbolName = (typeof SYMBOL_NAMES)[number];
