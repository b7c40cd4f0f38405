import type { Period } from './recorder';
import type { Waveform } from './waveform';

/** s; the window that takes the place of a half period on DC. */
export const DC_WINDOW = 0.01;
/** Share by which a row may differ from the one before it and still repeat it. */
const REPEATS = { bus: 1e-3, rms: 0.02 };
/** Rows in a row that must repeat. */
const ROWS = 3;

/** Cuts the waveform into half periods between zeros of the source voltage. */
export class Periods {
  readonly rows: Period[] = [];
  readonly length: number;
  private readonly offset: number;
  private peak = 0;
  private lowest = Infinity;
  private highest = 0;
  private fresh = 0;
  private start: { t: number; i2t: number; source: number; body: Float64Array };

  constructor(
    private readonly wave: Waveform,
  ) {
    const { kind, frequency, phase } = wave.circuit.path.source;
    this.length = kind === 'ac' ? 0.5 / frequency : DC_WINDOW;
    this.offset = kind === 'ac' ? -phase / (2 * Math.PI * frequency) : 0;
    this.start = this.mark();
  }

  private mark() {
    const { t, tally } = this.wave;
    return { t, i2t: tally.i2t, source: tally.source, body: Float64Array.from(tally.body) };
  }

  /** The next boundary after `t`, s. */
  next(t: number): number {
    return this.offset + (Math.floor((t - this.offset) / this.length + 1e-7) + 1) * this.length;
  }

  add(): void {
    const { tally } = this.wave;
    for (const { line, bus } of [tally.start, tally.middle, tally.end]) {
      this.peak = Math.max(this.peak, Math.abs(line));
      this.lowest = Math.min(this.lowest, bus);
      this.highest = Math.max(this.highest, bus);
    }
  }

  /** Ends the row at this instant. */
  cut(): void {
    const { wave, start, length } = this;
    const { t, tally, y, circuit } = wave;
    const span = Math.max(t - start.t, 1e-12);
    this.rows.push({
      start: start.t,
      end: t,
      peak: this.peak,
      rms: Math.sqrt(Math.max(0, tally.i2t - start.i2t) / Math.max(length, span)),
      lowestBus: Number.isFinite(this.lowest) ? this.lowest : y[0]!,
      highestBus: this.highest,
      sourcePower: (tally.source - start.source) / span,
      bodyPower: Array.from(tally.body, (energy, k) => (energy - start.body[k]!) / span),
      temperature: Array.from(y.subarray(1, 1 + circuit.count)),
      energy: Array.from(tally.body),
      i2t: tally.i2t,
    });
    this.start = this.mark();
    [this.peak, this.lowest, this.highest] = [0, Infinity, 0];
  }

  /** Whether the last rows repeat each other. */
  get repeats(): boolean {
    const { rows } = this;
    if (rows.length <= this.fresh + ROWS) return false;
    const amplitude = this.wave.circuit.path.source.amplitude;
    return rows.slice(-ROWS).every((row, k) => {
      const previous = rows[rows.length - ROWS + k - 1]!;
      const close = (a: number, b: number) => Math.abs(a - b) < REPEATS.bus * amplitude;
      const sameCurrent = Math.abs(row.rms - previous.rms) <= REPEATS.rms * Math.max(row.rms, previous.rms, 1e-3);
      return close(row.highestBus, previous.highestBus) && close(row.lowestBus, previous.lowestBus) && sameCurrent;
    });
  }

  /** After a soak the next rows must show anew that they repeat. */
  restart(): void {
    this.fresh = this.rows.length;
    this.start = this.mark();
    [this.peak, this.lowest, this.highest] = [0, Infinity, 0];
  }
}
