import type { Waveform } from './waveform';

/** Share of the peak at which a DC pulse counts as ended where the current never crosses zero. */
const DC_END = 0.01;
/** Share of the highest current so far below which no instant of a step is looked at more closely. */
const NEAR_PEAK = 0.8;
/** Share of the shortest time constant over which a slope is taken. */
const MOMENT = 1e-5;

type Pair = readonly [number, number];

/** The first conduction interval: peak, widths, I²t and energy. */
export class FirstPulse {
  peak = 0;
  peakAt = 0;
  i2t = 0;
  energy: number[] = [];
  ended = false;
  private readonly time: number[] = [];
  private readonly current: number[] = [];
  private began = false;
  private readonly slope: Float64Array;
  private readonly moved: Float64Array;

  constructor(private readonly wave: Waveform) {
    this.slope = new Float64Array(wave.circuit.size);
    this.moved = new Float64Array(wave.circuit.size);
  }

  add(from: number, h: number): void {
    if (this.ended) return;
    const { wave } = this;
    const { start, middle, end } = wave.tally;
    const lines = [Math.abs(start.line), Math.abs(middle.line), Math.abs(end.line)];
    if (!this.began && Math.max(...lines) === 0) return;
    this.began = true;
    const times = [from, from + h / 2, wave.t];
    times.forEach((time, n) => {
      this.time.push(time);
      this.current.push(lines[n]!);
      if (lines[n]! > this.peak) [this.peak, this.peakAt] = [lines[n]!, time];
    });
    this.refinePeak(times, lines);
    this.i2t = wave.tally.i2t;
    this.energy = Array.from(wave.tally.body);
    this.ended = this.isOver(start.line, end.line);
  }

  /** The crest between two instants where the slope turns, on the cubic through both values and slopes. */
  private refinePeak([t0, t1, t2]: number[], [a, b, c]: number[]): void {
    const { before, middle, y } = this.wave;
    if (Math.max(a!, b!, c!) < NEAR_PEAK * this.peak) return;
    const slopes = [this.slopeAt(before, t0!), this.slopeAt(middle, t1!), this.slopeAt(y, t2!)] as const;
    this.crestBetween(t0!, t1!, [a!, b!], [slopes[0], slopes[1]]);
    this.crestBetween(t1!, t2!, [b!, c!], [slopes[1], slopes[2]]);
  }

  private crestBetween(from: number, to: number, [left, right]: Pair, [rise, fall]: Pair): void {
    if (!(rise > 0 && fall < 0)) return;
    const width = to - from;
    const [m0, m1, step] = [rise * width, fall * width, right - left];
    const [quadratic, cubic] = [3 * step - 2 * m0 - m1, m0 + m1 - 2 * step];
    const s = m0 / (Math.sqrt(quadratic * quadratic - 3 * cubic * m0) - quadratic);
    const crest = left + s * (m0 + s * (quadratic + s * cubic));
    if (crest > this.peak) [this.peak, this.peakAt] = [crest, from + s * width];
  }

  /** d|i|/dt, A/s; where the current follows the voltages, by their movement over a short moment. */
  private slopeAt(y: Float64Array, t: number): number {
    const { slope, moved } = this;
    const { circuit } = this.wave;
    circuit.derivative(slope, y, t);
    const moment = MOMENT * circuit.fastestTime(y);
    for (let k = 0; k < circuit.size; k += 1) moved[k] = y[k]! + moment * slope[k]!;
    return (Math.abs(circuit.lineCurrent(moved, t + moment)) - Math.abs(circuit.lineCurrent(y, t))) / moment;
  }

  private isOver(before: number, after: number): boolean {
    const { circuit } = this.wave;
    if (circuit.path.source.kind === 'ac') return Math.abs(after) <= 1e-9 * this.peak;
    return before * after < 0 || (Math.abs(after) < Math.abs(before) && Math.abs(after) < DC_END * this.peak);
  }

  /** Time for which the current stays above a share of the peak, s. */
  width(share: number): number | null {
    const level = share * this.peak;
    const { time, current } = this;
    const rise = current.findIndex((one) => one >= level);
    if (rise < 0) return null;
    const fall = current.findIndex((one, k) => k > rise && one < level && time[k]! > this.peakAt);
    if (fall < 0) return null;
    const cross = (k: number) => {
      const [a, b] = [current[k - 1]!, current[k]!];
      return b === a ? time[k]! : time[k - 1]! + ((level - a) / (b - a)) * (time[k]! - time[k - 1]!);
    };
    return cross(fall) - (rise === 0 ? time[0]! : cross(rise));
  }
}
