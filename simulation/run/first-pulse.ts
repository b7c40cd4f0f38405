import type { Conduction } from '../circuit/circuit';
import { Crest } from './crest';
import type { Waveform } from './waveform';

/** Share of the peak at which a DC pulse counts as ended where the current never crosses zero. */
const DC_END = 0.01;

/** The first conduction interval: peak, widths, I²t and energy. */
export class FirstPulse {
  i2t = 0;
  energy: number[] = [];
  ended = false;
  private readonly time: number[] = [];
  private readonly current: number[] = [];
  /** Direction of the conduction; 0 before it begins. */
  private direction: Conduction = 0;
  private readonly crest: Crest;

  constructor(private readonly wave: Waveform) {
    this.crest = new Crest(wave);
  }

  get peak(): number {
    return this.crest.value;
  }

  get peakAt(): number {
    return this.crest.at;
  }

  add(from: number, h: number): void {
    if (this.ended) return;
    const { wave, direction } = this;
    const { start, middle, end } = wave.tally;
    const lines = [Math.abs(start.line), Math.abs(middle.line), Math.abs(end.line)];
    if (direction === 0 && Math.max(...lines) === 0) return;
    // However small the current that a pulse ends with: the next conduction is not part of it.
    this.ended = direction !== 0 && wave.circuit.conduction !== direction;
    if (this.ended) return;
    this.direction = wave.circuit.conduction;
    this.crest.add(from, h);
    this.time.push(from, from + h / 2, wave.t);
    this.current.push(...lines);
    this.i2t = wave.tally.i2t;
    this.energy = Array.from(wave.tally.body);
    this.ended = this.isOver(start.line, end.line);
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
