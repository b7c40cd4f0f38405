import type { Check } from '../../shared/model/check';
import type { Fuse } from '../../shared/model/protection';
import { judge, type Finding } from './judge';

/** Cumulative I²t (A²s) against time (s), both rising. */
export interface RunningI2t {
  time: readonly number[];
  i2t: readonly number[];
}

export interface FuseUse {
  /** I²t of the worst window, A²s. */
  value: number;
  /** What the fuse stands over a window that wide, A²s. */
  rating: number;
  /** s */
  width: number;
}

type Curve = Fuse['preArcing'];

/**
 * Minimum pre-arcing I²t (A²s) for a current that flows for `time` (s): between the points straight in
 * log–log, at constant I²t before the first and after the last.
 */
export const preArcingAt = (curve: Curve, time: number): number | null => {
  const [first, last] = [curve[0], curve[curve.length - 1]];
  if (!first || !last) return null;
  if (time <= first.time) return first.i2t;
  if (time >= last.time) return last.i2t;
  const index = curve.findIndex((point) => point.time >= time);
  const [before, after] = [curve[index - 1] ?? first, curve[index] ?? last];
  const share = Math.log(time / before.time) / Math.log(after.time / before.time);
  return before.i2t * (after.i2t / before.i2t) ** share;
};

const WIDTHS_PER_DECADE = 12;
const SHORTEST = 5e-5;

/** The window from which the rated current alone, carried for ever, would reach the curve: the steady check's domain. */
const widestWindow = (fuse: Fuse, factor: number): number => {
  const reached = (time: number): boolean => fuse.ratedCurrent ** 2 * time >= factor * (preArcingAt(fuse.preArcing, time) ?? 0);
  let [low, high] = [SHORTEST, 1e5];
  if (reached(low)) return low;
  for (let count = 0; count < 60; count += 1) {
    const middle = Math.sqrt(low * high);
    if (reached(middle)) high = middle;
    else low = middle;
  }
  return low;
};

/** Highest I²t in any window of `width`: a leading edge or a pause before the pulse must not flatter it. */
const worstWindow = ({ time, i2t }: RunningI2t, width: number): number => {
  let worst = 0;
  let start = 0;
  for (let end = 0; end < time.length; end += 1) {
    const from = time[end]! - width;
    while (start + 1 < end && time[start + 1]! <= from) start += 1;
    let before = 0;
    if (from > time[0]!) {
      const span = time[start + 1]! - time[start]!;
      const share = span > 0 ? Math.min(1, (from - time[start]!) / span) : 1;
      before = i2t[start]! + share * (i2t[start + 1]! - i2t[start]!);
    } else before = i2t[0]!;
    worst = Math.max(worst, i2t[end]! - before);
  }
  return worst;
};

const widthsOf = (curve: Curve, widest: number): number[] => {
  // A curve of one height is used up most by the widest window.
  if (curve.length === 1) return [widest];
  const count = Math.ceil(Math.log10(widest / SHORTEST) * WIDTHS_PER_DECADE);
  const spaced = Array.from({ length: count }, (_, index) => SHORTEST * 10 ** (index / WIDTHS_PER_DECADE));
  return [...spaced, ...curve.map((point) => point.time).filter((time) => time < widest), widest];
};

/** Where a run uses up most of the fuse's minimum pre-arcing curve, windows of every width tried. Null without a curve. */
export const fuseUse = (running: RunningI2t, fuse: Fuse): FuseUse | null => {
  const factor = fuse.pulseFactor ?? 1;
  if (fuse.preArcing.length === 0 || running.time.length === 0) return null;
  let worst: FuseUse | null = null;
  for (const width of widthsOf(fuse.preArcing, widestWindow(fuse, factor))) {
    const value = worstWindow(running, width);
    const rating = factor * (preArcingAt(fuse.preArcing, width) ?? 0);
    if (!worst || value / rating > worst.value / worst.rating) worst = { value, rating, width };
  }
  return worst;
};

/** Running I²t against the minimum pre-arcing curve times the factor for the stated number of starts. */
export const fuseRunningI2tCheck = (
  found: Finding,
  rating: { worst: number | null; nominal: number | null },
  fuse: Fuse,
  cautionBelow: number,
): Check => {
  const missing = [
    ...(fuse.preArcing.length ? [] : ['the minimum pre-arcing I²t of the fuse']),
    ...(fuse.pulseFactor === undefined ? ['the pulse factor of the fuse: repeated starts are not assessed, a single one is'] : []),
  ];
  const curve = fuse.preArcing.length > 1 ? 'minimum pre-arcing curve' : 'one pre-arcing figure, taken as constant I²t';
  return judge(
    {
      id: 'fuse-running-i2t',
      dimension: 'i2t',
      sense: 'at-most',
      finding: found,
      rating: rating.worst,
      nominalRating: rating.nominal,
      basis: `Worst window of the running I²t against the ${curve}, times the pulse factor ${fuse.pulseFactor ?? 1}, up to where the rated current alone would reach it.`,
      missing,
    },
    cautionBelow,
  );
};
