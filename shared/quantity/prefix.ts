/** SI prefixes as typed and shown; `m` and `M` are never confused, `K` is taken for `k` only where it cannot be kelvin. */
export const PREFIX_FACTOR: Readonly<Record<string, number>> = {
  f: 1e-15, p: 1e-12, n: 1e-9, u: 1e-6, m: 1e-3, k: 1e3, M: 1e6, G: 1e9, T: 1e12,
};

/** Prefixes used in display, from small to large, with the power of ten they stand for. */
export const DISPLAY_PREFIXES = [
  { symbol: 'f', exponent: -15 }, { symbol: 'p', exponent: -12 }, { symbol: 'n', exponent: -9 },
  { symbol: 'µ', exponent: -6 }, { symbol: 'm', exponent: -3 }, { symbol: '', exponent: 0 },
  { symbol: 'k', exponent: 3 }, { symbol: 'M', exponent: 6 }, { symbol: 'G', exponent: 9 }, { symbol: 'T', exponent: 12 },
] as const;
