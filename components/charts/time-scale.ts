/** x of the split-time plot: linear in milliseconds for the waveform, then a fold, then logarithmic in seconds for the soak. */
export interface TimeScale {
  left: number;
  right: number;
  /** Null where the run ends with its waveform: then there is no soak and no fold. */
  fold: { left: number; right: number } | null;
  foldAt: number;
  end: number;
  toX: (seconds: number) => number;
  toTime: (x: number) => number;
  /** Seconds. */
  major: readonly number[];
  minor: readonly number[];
}

interface Room {
  left: number;
  right: number;
  foldWidth: number;
  /** Share of the width that the waveform takes. */
  waveformShare: number;
}

const STEPS = [1, 2, 5] as const;
/** The step of the series 1, 2, 5 that gives at most `count` ticks over `span`. */
export const niceStep = (span: number, count: number): number => {
  const rough = span / count;
  const decade = 10 ** Math.floor(Math.log10(rough));
  return decade * (STEPS.find((step) => step * decade >= rough * (1 - 1e-9)) ?? 10);
};

/** Multiples of `step` from `low` to `high`, free of the dust of binary fractions. */
export const multiples = (low: number, high: number, step: number): number[] => {
  const first = Math.ceil(low / step - 1e-9);
  const count = Math.floor(high / step + 1e-9) - first + 1;
  return Array.from({ length: Math.max(0, count) }, (_, index) => Number(((first + index) * step).toPrecision(12)));
};

const decadesBetween = (low: number, high: number): number[] =>
  multiples(Math.log10(low), Math.log10(high), 1).map((exponent) => Number((10 ** exponent).toPrecision(12)));

const logMinors = (low: number, high: number): number[] =>
  decadesBetween(low / 10, high).flatMap((decade) => [2, 3, 4, 5, 6, 7, 8, 9].map((digit) => digit * decade)).filter((one) => one > low && one <= high);

const LINEAR_TICKS = 5;

export const makeTimeScale = (foldAt: number, end: number, { left, right, foldWidth, waveformShare }: Room): TimeScale => {
  const hasSoak = end > foldAt * 1.0001;
  const waveEnd = hasSoak ? left + (right - left - foldWidth) * waveformShare : right;
  const fold = hasSoak ? { left: waveEnd, right: waveEnd + foldWidth } : null;
  const soakLeft = fold?.right ?? right;
  const waveTo = hasSoak ? foldAt : end;
  const decades = hasSoak ? Math.log10(end / foldAt) : 1;
  const toX = (seconds: number): number => {
    if (seconds <= waveTo || !fold) return left + (Math.max(0, seconds) / waveTo) * (waveEnd - left);
    return soakLeft + (Math.log10(Math.min(seconds, end) / foldAt) / decades) * (right - soakLeft);
  };
  const toTime = (x: number): number => {
    if (x <= waveEnd || !fold) return (Math.max(0, x - left) / (waveEnd - left)) * waveTo;
    return foldAt * 10 ** ((Math.max(0, Math.min(x, right) - soakLeft) / (right - soakLeft)) * decades);
  };
  const step = niceStep(waveTo, LINEAR_TICKS);
  const atFold = (seconds: number) => hasSoak && seconds >= waveTo * 0.999;
  const linear = multiples(0, waveTo, step).filter((one) => !atFold(one));
  const quarter = step / 4;
  const soak = hasSoak ? decadesBetween(foldAt, end) : [];
  const major = [...linear, ...soak];
  const minor = [...multiples(0, waveTo, quarter).filter((one) => !linear.includes(one) && !atFold(one)), ...(hasSoak ? logMinors(foldAt, end) : [])];
  return { left, right, fold, foldAt: waveTo, end, toX, toTime, major, minor };
};

/** A time as the cursor tells it: milliseconds below a second. */
export const timeText = (seconds: number): string => {
  const milli = seconds < 0.9995;
  const value = milli ? seconds * 1000 : seconds;
  return `${value.toFixed(value >= 99.95 ? 0 : 1)} ${milli ? 'ms' : 's'}`;
};
