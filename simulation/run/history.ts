import type { Waveform } from './waveform';

/** Instants of the first stretch of a run in columns; SI. Elements in order. */
export class History {
  readonly time: number[] = [];
  readonly current: number[] = [];
  readonly bus: number[] = [];
  readonly i2t: number[] = [];
  readonly temperature: number[][];
  readonly energy: number[][];

  constructor(private readonly wave: Waveform) {
    this.temperature = wave.circuit.path.elements.map(() => []);
    this.energy = wave.circuit.path.elements.map(() => []);
    this.push(0, wave.circuit.conduction * wave.circuit.lineCurrent(wave.y, wave.t), wave.y[0]!, wave.y);
  }

  /** The instants of the step that was just taken. */
  add(from: number, h: number): void {
    const { wave } = this;
    const { tally, y, middle, circuit } = wave;
    const s = circuit.conduction === 0 ? 0 : circuit.conduction;
    if (this.current[this.current.length - 1] === 0 && tally.start.line !== 0) this.push(from, s * tally.start.line, tally.start.bus, wave.before);
    this.push(from + h / 2, s * tally.middle.line, tally.middle.bus, middle);
    this.push(wave.t, s * tally.end.line, tally.end.bus, y);
  }

  private push(time: number, current: number, bus: number, y: Float64Array): void {
    const { tally } = this.wave;
    this.time.push(time);
    this.current.push(current);
    this.bus.push(bus);
    this.i2t.push(tally.i2t);
    this.temperature.forEach((column, k) => column.push(y[1 + k]!));
    this.energy.forEach((column, k) => column.push(tally.body[k]!));
  }
}

/** Linear interpolation of the instant at which `column` passes `level` between rows k−1 and k. */
export const passes = (time: readonly number[], column: readonly number[], k: number, level: number): number => {
  const [a, b] = [column[k - 1]!, column[k]!];
  return b === a ? time[k]! : time[k - 1]! + ((level - a) / (b - a)) * (time[k]! - time[k - 1]!);
};
