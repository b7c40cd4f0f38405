/** SI prefixes as typed, with the power of ten they stand for; `m` and `M` are never confused. */
export const PREFIX_EXPONENT: Readonly<Record<string, number>> = {
  f: -15, p: -12, n: -9, u: -6, m: -3, k: 3, M: 6, G: 9, T: 12,
};

/** Prefixes used in display, from small to large. */
export const DISPLAY_PREFIXES = [
  { symbol: 'f', exponent: -15 }, { symbol: 'p', exponent: -12 }, { symbol: 'n', exponent: -9 },
  { symbol: 'µ', exponent: -6 }, { symbol: 'm', exponent: -3 }, { symbol: '', exponent: 0 },
  { symbol: 'k', exponent: 3 }, { symbol: 'M', exponent: 6 }, { symbol: 'G', exponent: 9 }, { symbol: 'T', exponent: 12 },
] as const;
