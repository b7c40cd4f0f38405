export interface Polyline {
  x: number[];
  y: number[];
}

/**
 * Thins a curve to what a screen can show: for each pixel column its first, lowest, highest and last point, in their
 * order, so that no peak is lost.
 * @param x pixels, rising
 */
export const thinOut = (x: readonly number[], y: readonly number[], column = 1): Polyline => {
  const kept: Polyline = { x: [], y: [] };
  let start = 0;
  while (start < x.length) {
    const edge = Math.floor(x[start]! / column) * column + column;
    let end = start;
    let low = start;
    let high = start;
    while (end + 1 < x.length && x[end + 1]! < edge) {
      end += 1;
      if (y[end]! < y[low]!) low = end;
      if (y[end]! > y[high]!) high = end;
    }
    for (const index of [...new Set([start, low, high, end])].sort((a, b) => a - b)) {
      kept.x.push(x[index]!);
      kept.y.push(y[index]!);
    }
    start = end + 1;
  }
  return kept;
};

/** Index of the last entry at or before `at` in a rising list; 0 before the first. */
export const indexBefore = (rising: readonly number[], at: number): number => {
  let low = 0;
  let high = rising.length - 1;
  while (low < high) {
    const middle = Math.ceil((low + high) / 2);
    if (rising[middle]! <= at) low = middle;
    else high = middle - 1;
  }
  return low;
};

/** Index of the entry nearest to `at` in a rising list. */
export const indexNearest = (rising: readonly number[], at: number): number => {
  const before = indexBefore(rising, at);
  const next = rising[before + 1];
  return next !== undefined && next - at < at - rising[before]! ? before + 1 : before;
};

/** Linear between the two neighbours, the end value beyond the ends; null of an empty series. */
export const valueAt = (rising: readonly number[], values: readonly number[], at: number): number | null => {
  const index = indexBefore(rising, at);
  const here = values[index];
  if (here === undefined) return null;
  const next = values[index + 1];
  const from = rising[index]!;
  const to = rising[index + 1];
  if (next === undefined || to === undefined || at <= from || to === from) return here;
  return here + ((next - here) * (at - from)) / (to - from);
};

/** Thins a band: for each pixel column its lowest low and its highest high. */
export const thinBand = (x: readonly number[], low: readonly number[], high: readonly number[], column = 1.5): { x: number; low: number; high: number }[] => {
  const kept: { x: number; low: number; high: number }[] = [];
  x.forEach((at, index) => {
    const last = kept[kept.length - 1];
    if (last && at < last.x + column) {
      last.low = Math.min(last.low, low[index]!);
      last.high = Math.max(last.high, high[index]!);
    } else kept.push({ x: at, low: low[index]!, high: high[index]! });
  });
  return kept;
};
