import type { Waveform } from './waveform';

/** Share of the peak at which a DC pulse counts as ended where the current never crosses zero. */
const DC_END = 0.01;

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

  constructor(private readonly wave: Waveform) {}

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

  /** The crest of the parabola through the three instants, where the middle one is highest. */
  private refinePeak([t0, t1]: number[], [a, b, c]: number[]): void {
    if (!(b! > a! && b! >= c!)) return;
    const curve = a! - 2 * b! + c!;
    const shift = (0.5 * (a! - c!)) / curve;
    const crest = b! - (curve * shift * shift) / 2;
    if (crest > this.peak) [this.peak, this.peakAt] = [crest, t1! + shift * (t1! - t0!)];
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
