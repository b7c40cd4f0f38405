/** A series over time, times rising. */
export interface Series {
  time: readonly number[];
  value: readonly number[];
}

export interface Band {
  low: number[];
  high: number[];
}

const valueAt = ({ time, value }: Series, at: number, after: number): number => {
  const [t0, t1] = [time[after - 1], time[after]];
  if (t1 === undefined) return value[value.length - 1] ?? NaN;
  if (t0 === undefined) return value[0] ?? NaN;
  const share = t1 > t0 ? (at - t0) / (t1 - t0) : 1;
  return value[after - 1]! + share * (value[after]! - value[after - 1]!);
};

const include = (band: Band, index: number, value: number): void => {
  if (value < band.low[index]!) band.low[index] = value;
  if (value > band.high[index]!) band.high[index] = value;
};

export const emptyBand = (length: number): Band => ({ low: Array<number>(length).fill(Infinity), high: Array<number>(length).fill(-Infinity) });

/** Widens the band by one series on the axis; a sample between two points of the axis counts for both, so that no peak is lost. */
export const widen = (band: Band, axis: readonly number[], series: Series): void => {
  // A run that is followed for the first cycles only says nothing about later ones.
  const end = (series.time[series.time.length - 1] ?? -Infinity) * (1 + 1e-9);
  let after = 0;
  for (let index = 0; index < axis.length; index += 1) {
    const at = axis[index]!;
    while (after < series.time.length && series.time[after]! < at) {
      const value = series.value[after]!;
      if (index > 0) include(band, index - 1, value);
      if (index > 0 && series.time[after]! > axis[index - 1]!) include(band, index, value);
      after += 1;
    }
    if (at <= end) include(band, index, valueAt(series, at, after));
  }
};
