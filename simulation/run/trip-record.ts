import type { Periods } from './periods';
import type { Waveform } from './waveform';

/** When a polymer PTC tripped and what it let through from the begin of the fault (without one from switch-on); SI. */
export class TripRecord {
  at: number | null = null;
  i2t = 0;
  energy = 0;
  from = 0;
  private reference = 0;
  private before = { i2t: 0, energy: 0 };

  constructor(
    private readonly wave: Waveform,
    private readonly periods: Periods,
  ) {}

  faultBegins(at: number): void {
    const { tally } = this.wave;
    this.from = at;
    this.before = { i2t: tally.i2t, energy: tally.body[0] ?? 0 };
  }

  /** Its resistance says so: what counts apart from a step fault. */
  byResistance(): void {
    if (this.at === null && !this.wave.circuit.path.fault) this.note();
  }

  /** On a step fault a PTC has tripped when the current is below half of what it was when the fault began. */
  byCurrent(): void {
    const { wave, periods } = this;
    const { circuit, tally } = wave;
    if (!circuit.faulted || this.at !== null || !circuit.path.elements.some(({ kind }) => kind === 'polymer-ptc')) return;
    const row = periods.rows[periods.rows.length - 1];
    const halfPeriod = row && row.start >= this.from ? row.rms : 0;
    const line = circuit.path.source.kind === 'dc' ? Math.abs(tally.end.line) : halfPeriod;
    this.reference = Math.max(this.reference, line);
    if (line > 0 && line < this.reference / 2) this.note();
  }

  private note(): void {
    const { tally, t } = this.wave;
    this.at = t;
    this.i2t = tally.i2t - this.before.i2t;
    this.energy = (tally.body[0] ?? 0) - this.before.energy;
  }
}
