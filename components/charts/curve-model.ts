import { multiples, niceStep } from './time-scale';

export interface CurveAxis {
  domain: readonly [number, number];
  ticks: readonly number[];
  /** The ticks that carry a number. */
  labelled: readonly number[];
}
export interface CurveModel {
  width: number;
  height: number;
  padding: { left: number; right: number; top: number; bottom: number };
  x: CurveAxis;
  y: CurveAxis & { scale: 'linear' | 'log' };
  line: readonly { x: number; y: number }[];
  band: readonly { x: number; low: number; high: number }[];
  toX: (value: number) => number;
  toY: (value: number) => number;
}
export interface CurveInput {
  x: { values: readonly number[]; domain?: readonly [number, number] };
  y: { scale: 'linear' | 'log'; domain?: readonly [number, number] };
  line: readonly number[];
  band?: { low: readonly number[]; high: readonly number[] };
  /** Further values that must lie inside, such as measured points. */
  points?: readonly { x: number; y: number }[];
  width: number;
  height: number;
}

const PADDING = { left: 50, right: 14, top: 24, bottom: 42 } as const;
const X_TICKS = { wide: 6, narrow: 4 } as const;
const NARROW = 480;
/** From this many decades on only the decades carry lines, or the grid turns into a ground. */
const FINE_DECADES = 5;

const logAxis = ([low, high]: readonly [number, number]): CurveAxis => {
  const decades = multiples(Math.floor(Math.log10(low)), Math.ceil(Math.log10(high)), 1).map((exponent) => Number((10 ** exponent).toPrecision(12)));
  const fine = Math.log10(high / low) < FINE_DECADES ? [1, 2, 3, 4, 5, 6, 7, 8, 9] : [1];
  const ticks = decades.flatMap((decade) => fine.map((digit) => Number((digit * decade).toPrecision(12)))).filter((one) => one >= low * 0.999 && one <= high * 1.001);
  const inside = decades.filter((one) => one >= low * 0.999 && one <= high * 1.001);
  return { domain: [low, high], ticks, labelled: inside.length >= 2 ? inside : ticks };
};

const linearAxis = (domain: readonly [number, number], count: number): CurveAxis => {
  const ticks = multiples(domain[0], domain[1], niceStep(domain[1] - domain[0], count));
  return { domain, ticks, labelled: ticks };
};

const yDomain = (values: readonly number[], scale: 'linear' | 'log'): [number, number] => {
  const [low, high] = [Math.min(...values), Math.max(...values)];
  return scale === 'log' ? [low / 1.4, high * 1.4] : [Math.min(0, low), high > 0 ? high * 1.15 : 1];
};

/** Ticks, domains and places of a curve; a logarithmic axis leaves out what is not above zero. */
export const makeCurve = ({ x, y, line, band, points = [], width, height }: CurveInput): CurveModel => {
  const drawable = (value: number | undefined): value is number => value !== undefined && Number.isFinite(value) && (y.scale === 'linear' || value > 0);
  const lineData = x.values.flatMap((at, index) => (drawable(line[index]) ? [{ x: at, y: line[index]! }] : []));
  const bandData = band ? x.values.flatMap((at, index) => (drawable(band.low[index]) && drawable(band.high[index]) ? [{ x: at, low: band.low[index]!, high: band.high[index]! }] : [])) : [];
  const values = [...lineData.map((one) => one.y), ...bandData.flatMap((one) => [one.low, one.high]), ...points.map((one) => one.y)];
  const across = x.domain ?? [Math.min(...x.values), Math.max(...x.values)];
  const up = y.domain ?? yDomain(values, y.scale);
  const share = y.scale === 'log' ? (value: number) => Math.log(value / up[0]) / Math.log(up[1] / up[0]) : (value: number) => (value - up[0]) / (up[1] - up[0]);
  return {
    width, height, padding: PADDING,
    x: linearAxis(across, width < NARROW ? X_TICKS.narrow : X_TICKS.wide),
    y: { ...(y.scale === 'log' ? logAxis(up) : linearAxis(up, 4)), scale: y.scale },
    line: lineData, band: bandData,
    toX: (value) => PADDING.left + ((value - across[0]) / (across[1] - across[0])) * (width - PADDING.left - PADDING.right),
    toY: (value) => height - PADDING.bottom - share(value) * (height - PADDING.top - PADDING.bottom),
  };
};
