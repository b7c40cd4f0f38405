/** A monotone interpolant with its derivative and inverse. */
export interface MonotoneCubic {
  value(x: number): number;
  slope(x: number): number;
}

const harmonicSlopes = (x: readonly number[], y: readonly number[]): number[] => {
  const secant = x.slice(1).map((right, k) => (y[k + 1]! - y[k]!) / (right - x[k]!));
  return x.map((_, k) => {
    const [before, after] = [secant[k - 1], secant[k]];
    if (before === undefined) return after!;
    if (after === undefined) return before;
    if (before * after <= 0) return 0;
    const [left, right] = [x[k]! - x[k - 1]!, x[k + 1]! - x[k]!];
    const [w1, w2] = [2 * right + left, right + 2 * left];
    return (w1 + w2) / (w1 / before + w2 / after);
  });
};

const lastAtOrBelow = (x: readonly number[], at: number): number => {
  let [low, high] = [0, x.length - 2];
  while (low < high) {
    const middle = (low + high + 1) >> 1;
    if (x[middle]! <= at) low = middle;
    else high = middle - 1;
  }
  return low;
};

/**
 * Piecewise cubic through rising `x` that never overshoots; linear beyond its ends.
 * Source: Fritsch & Butland, SIAM J. Sci. Stat. Comput. 5 (1984) 300–304 (slopes; from memory).
 */
export const monotoneCubic = (x: readonly number[], y: readonly number[]): MonotoneCubic => {
  const m = harmonicSlopes(x, y);
  const [first, last] = [0, x.length - 1];
  const at = (point: number, order: 0 | 1): number => {
    const edge = point < x[first]! ? first : point > x[last]! ? last : null;
    if (edge !== null) return order === 1 ? m[edge]! : y[edge]! + m[edge]! * (point - x[edge]!);
    const k = lastAtOrBelow(x, point);
    const h = x[k + 1]! - x[k]!;
    const s = (point - x[k]!) / h;
    const [y0, y1, d0, d1] = [y[k]!, y[k + 1]!, m[k]! * h, m[k + 1]! * h];
    const [c2, c3] = [3 * (y1 - y0) - 2 * d0 - d1, 2 * (y0 - y1) + d0 + d1];
    return order === 0 ? y0 + s * (d0 + s * (c2 + s * c3)) : (d0 + s * (2 * c2 + 3 * s * c3)) / h;
  };
  return { value: (point) => at(point, 0), slope: (point) => at(point, 1) };
};
