import type { Waveform } from './waveform';

/** Share of the highest current so far below which no instant of a step is looked at more closely. */
const NEAR = 0.8;
/** Share of the shortest time constant over which a slope is taken. */
const MOMENT = 1e-5;

type Pair = readonly [number, number];

/** The highest line current of the steps that it is told of, found between their instants; A, s. */
export class Crest {
  value = 0;
  at = 0;
  private readonly slope: Float64Array;
  private readonly moved: Float64Array;

  constructor(private readonly wave: Waveform) {
    this.slope = new Float64Array(wave.circuit.size);
    this.moved = new Float64Array(wave.circuit.size);
  }

  /** To be told of the step that was just taken. */
  add(from: number, h: number): void {
    const { before, middle, y, t, tally } = this.wave;
    const [a, b, c] = [Math.abs(tally.start.line), Math.abs(tally.middle.line), Math.abs(tally.end.line)];
    const highest = Math.max(a, b, c);
    if (highest < NEAR * this.value || highest === 0) return;
    const half = from + h / 2;
    this.take(a, from);
    this.take(b, half);
    this.take(c, t);
    const slopes = [this.slopeAt(before, from), this.slopeAt(middle, half), this.slopeAt(y, t)] as const;
    this.between(from, half, [a, b], [slopes[0], slopes[1]]);
    this.between(half, t, [b, c], [slopes[1], slopes[2]]);
  }

  private take(value: number, at: number): void {
    if (value > this.value) [this.value, this.at] = [value, at];
  }

  /** Where the slope turns: the crest of the cubic through both values and slopes. */
  private between(from: number, to: number, [left, right]: Pair, [rise, fall]: Pair): void {
    if (!(rise > 0 && fall < 0)) return;
    const width = to - from;
    const [m0, m1, step] = [rise * width, fall * width, right - left];
    const [quadratic, cubic] = [3 * step - 2 * m0 - m1, m0 + m1 - 2 * step];
    const s = m0 / (Math.sqrt(quadratic * quadratic - 3 * cubic * m0) - quadratic);
    this.take(left + s * (m0 + s * (quadratic + s * cubic)), from + s * width);
  }

  /** d|i|/dt, A/s, by the movement of the whole state over a short moment. */
  private slopeAt(y: Float64Array, t: number): number {
    const { slope, moved } = this;
    const { circuit } = this.wave;
    circuit.derivative(slope, y, t);
    const moment = MOMENT * circuit.fastestTime(y);
    for (let k = 0; k < circuit.size; k += 1) moved[k] = y[k]! + moment * slope[k]!;
    return (Math.abs(circuit.lineCurrent(moved, t + moment)) - Math.abs(circuit.lineCurrent(y, t))) / moment;
  }
}
