import type { Circuit, Conduction } from '../circuit/circuit';
import { DoubledStep } from '../solver/doubled-step';
import { earliestCrossing, INSTANT, type Watch } from './crossing';
import { Tally } from './tally';

/** Something that happens at a known time. */
export interface Scheduled {
  at: number;
  apply: () => void;
}

export interface WaveformOptions {
  tolerance: number;
  /** Right-hand sides allowed. */
  budget: number;
}

/** Told of every accepted step. */
export type OnStep = (wave: Waveform, from: number, h: number) => void;

const SIDES_PER_STEP = 12;
/** Share of the source amplitude that a following bus may lag. */
const LAG = 2e-3;
/** Steps after which a hard start is over. */
const SEVERAL = 100;
/** Share of the source amplitude within which a driving voltage counts as zero. */
const NEARLY = 1e-9;
/** Time constants in one step of two halves; each half is stable up to 2.78. */
const STABLE = 5;
/** Steps from the begin of a pulse to its crest, at least: of the first, which is reported, and of all others. */
const FIRST_PARTS = 10;
const LATER_PARTS = 3;
/** Below these an error counts absolutely: K, share of the source amplitude, share of the largest current. */
const FLOOR = { temperature: 1, bus: 0.2, current: 0.02 };

/** Event-located integration of the circuit on the waveform scale. */
export class Waveform {
  t: number;
  readonly y: Float64Array;
  readonly middle: Float64Array;
  readonly before: Float64Array;
  private readonly slope: Float64Array;
  sides = 0;
  everInductive = false;
  /** Told of every end of a conduction, also where the next one follows at once. */
  onBlocked: () => void = () => undefined;
  stoppedAs: 'step-too-small' | 'step-budget' | null = null;
  readonly tally: Tally;
  private h: number;
  private steps = 0;
  /** Begin of the conduction that goes on, and from there to the next crest or zero; s. */
  private pulse = { since: -Infinity, toCrest: 0, parts: 1 };
  private readonly stepper: DoubledStep;
  private readonly floor: Float64Array;
  /** What errors are measured against: the rise of a temperature and the swing of the bus, not their absolute values. */
  private readonly origin: Float64Array;
  private readonly scheduled: Scheduled[] = [];

  constructor(
    readonly circuit: Circuit,
    start: { t: number; y: Float64Array },
    private readonly options: WaveformOptions,
    private readonly watches: () => readonly Watch[],
    private readonly onStep: OnStep,
  ) {
    const { amplitude, resistance, frequency } = circuit.path.source;
    this.t = start.t;
    this.y = Float64Array.from(start.y);
    this.middle = new Float64Array(circuit.size);
    this.before = new Float64Array(circuit.size);
    this.slope = new Float64Array(circuit.size);
    this.stepper = new DoubledStep(circuit.size, circuit.derivative);
    this.tally = new Tally(circuit);
    this.floor = new Float64Array(circuit.size).fill(FLOOR.temperature);
    this.origin = Float64Array.from(start.y);
    this.origin[circuit.size - 1] = 0;
    this.floor[0] = FLOOR.bus * amplitude;
    this.floor[circuit.size - 1] = (FLOOR.current * amplitude) / Math.max(resistance, circuit.seriesResistance(start.y));
    this.h = frequency > 0 ? 1e-3 / frequency : 1e-6;
  }

  schedule(one: Scheduled): void {
    this.scheduled.push(one);
    this.scheduled.sort((a, b) => a.at - b.at);
  }

  unschedule(one: Scheduled | null): void {
    const index = one ? this.scheduled.indexOf(one) : -1;
    if (index >= 0) this.scheduled.splice(index, 1);
  }

  /** Moves on to a later time after a soak; the state is set by the caller. */
  jump(t: number): void {
    this.t = t;
    const { frequency } = this.circuit.path.source;
    this.h = frequency > 0 ? 1e-3 / frequency : 1e-5;
  }

  nextScheduled(besides: Scheduled | null = null): number {
    return this.scheduled.find((one) => one !== besides)?.at ?? Infinity;
  }

  /** Integrates until `end`, or until a step or an event calls for a stop. */
  run(end: number, shouldStop: () => boolean): void {
    this.reconsiderInductance(false);
    this.applyDue();
    while (this.t < end - INSTANT && !this.stoppedAs && !shouldStop()) {
      this.settleConduction();
      this.reduce();
      this.advance(Math.min(end, this.nextScheduled(), this.nextQuarter()));
      this.applyDue();
    }
  }

  /** Leaves behind what has become too fast to matter: the rise of the current, or the charging of a small capacitor. */
  private reduce(): void {
    const { circuit, y, t } = this;
    if (circuit.conduction === 0) return;
    this.steps += 1;
    if (circuit.inductive) this.reconsiderInductance(this.steps % SEVERAL !== 0);
    else if (!circuit.follows) circuit.follows = circuit.mayFollow(y, t);
    else if (circuit.followingLag(y, t) > LAG * circuit.path.source.amplitude) circuit.follows = false;
  }

  private applyDue(): void {
    while (this.nextScheduled() <= this.t + INSTANT) {
      this.circuit.follows = false;
      this.scheduled.shift()!.apply();
    }
  }

  /** R(T) and contacts move under a standing current: whether that current must be a state is asked anew. */
  private reconsiderInductance(hardStart: boolean): void {
    const { circuit, y, t, tally } = this;
    if (circuit.conduction === 0) return;
    const needed = circuit.needsInductance(y, hardStart);
    if (needed === circuit.inductive) return;
    const [line, held] = [circuit.lineCurrent(y, t), circuit.storedEnergy(y)];
    circuit.inductive = needed;
    y[circuit.size - 1] = line;
    this.everInductive ||= needed;
    tally.dissipated += held - circuit.storedEnergy(y);
  }

  /** The next zero or crest of the source voltage: no step spans one, so that no pulse is jumped. */
  private nextQuarter(): number {
    const { kind, frequency, phase } = this.circuit.path.source;
    if (kind === 'dc' || !this.circuit.supplied) return Infinity;
    const quarters = 4 * frequency * this.t + (2 * phase) / Math.PI;
    return (Math.floor(quarters + 1e-7) + 1 - (2 * phase) / Math.PI) / (4 * frequency);
  }

  /** Starts or ends the conduction that the voltages ask for at this very instant; a bus that has run empty stays so. */
  private settleConduction(): void {
    const { circuit, y, t } = this;
    if (circuit.conduction !== 0) this.settleEnd();
    else if (Math.abs(y[0]!) < NEARLY * circuit.path.source.amplitude) y[0] = 0;
    if (circuit.conduction !== 0 || !circuit.supplied) return;
    const s: Conduction = circuit.sourceVoltage(t) < 0 ? -1 : 1;
    const slope = s * circuit.sourceSlope(t);
    const drive = circuit.drive(y, t, s);
    const nearly = NEARLY * circuit.path.source.amplitude;
    if (!circuit.bridge || drive > nearly || (drive > -nearly && slope > 0)) this.conduct(s, drive);
  }

  /** Ends a conduction whose current is gone and would turn against the diodes. */
  private settleEnd(): void {
    const { circuit, y, t, slope } = this;
    const { source } = circuit.path;
    const last = circuit.size - 1;
    if (!circuit.bridge || !circuit.inductive || y[last]! > 0) return;
    y[last] = 0;
    circuit.derivative(slope, y, t);
    if (slope[last]! * source.inductance < -NEARLY * source.amplitude) circuit.conduction = 0;
  }

  private conduct(s: Conduction, drive: number): void {
    const { circuit, y } = this;
    circuit.conduction = s;
    circuit.follows = false;
    this.steps = 0;
    this.pulse = { since: this.t, toCrest: this.nextQuarter() - this.t, parts: this.pulse.since < 0 ? FIRST_PARTS : LATER_PARTS };
    y[circuit.size - 1] = 0;
    circuit.inductive = circuit.needsInductance(y, drive > 1e-3 * circuit.path.source.amplitude);
    this.everInductive ||= circuit.inductive;
  }

  private advance(limit: number): void {
    const { y, stepper, before, circuit } = this;
    const room = limit - this.t;
    const wanted = this.h;
    let h = Math.min(wanted, room, this.longestStep());
    before.set(y);
    this.origin[0] = y[0]!;
    let cut = h < wanted;
    for (;;) {
      if (this.sides > this.options.budget) return this.stop('step-budget');
      stepper.take(before, this.t, h);
      this.sides += SIDES_PER_STEP;
      const error = stepper.error(this.floor, this.options.tolerance, this.origin);
      if (error <= 1) {
        // A step that only the limit cut short says nothing against a long one.
        this.h = Math.max(cut ? wanted : 0, h * Math.min(3, Math.max(1, 0.9 * error ** -0.2)));
        break;
      }
      cut = false;
      h *= Math.max(0.1, 0.9 * error ** -0.25);
      if (!(h > 1e-14 * Math.max(1, this.t))) return this.stop('step-too-small');
    }
    const found = earliestCrossing([...this.conductionWatch(), ...this.watches()], { stepper, before, t: this.t, h });
    if (found) {
      this.sides += found.sides;
      h = found.at;
      stepper.take(before, this.t, h);
      this.sides += SIDES_PER_STEP;
    }
    stepper.extrapolate();
    this.accept(h, h >= room - INSTANT ? limit : this.t + h);
    if (!found) return;
    circuit.follows = false;
    for (const apply of found.all) apply();
  }

  /**
   * A pulse of any width is taken in six steps or more, the first in twenty, or its heat would be summed too coarsely; and no step leaves
   * the stable region of the method, beyond which step doubling has a blind spot (whole step and halves agree, both wrong).
   */
  private longestStep(): number {
    const { circuit, pulse, t } = this;
    const fastest = circuit.fastestTime(this.y);
    if (circuit.conduction === 0) return STABLE * fastest;
    const begun = Math.max(Number.isFinite(pulse.toCrest) ? pulse.toCrest : fastest, t - pulse.since);
    return Math.min(STABLE * fastest, begun / pulse.parts);
  }

  private stop(reason: 'step-too-small' | 'step-budget'): void {
    this.stoppedAs = reason;
  }

  private accept(h: number, to: number): void {
    const { y, before, middle, stepper, tally } = this;
    y.set(stepper.end);
    middle.set(stepper.middle);
    const from = this.t;
    tally.add(h, before, middle, y, from);
    this.t = to;
    this.onStep(this, from, h);
  }

  private conductionWatch(): Watch[] {
    const { circuit } = this;
    if (!circuit.bridge || !circuit.supplied) return [];
    const s = circuit.conduction;
    if (s === 0) {
      const sign: Conduction = circuit.sourceVoltage(this.t) + 1e-3 * circuit.sourceSlope(this.t) / (2 * Math.PI * (circuit.path.source.frequency || 1)) < 0 ? -1 : 1;
      return [{ value: (y, t) => circuit.drive(y, t, sign), rising: true, apply: () => this.conduct(sign, 0) }];
    }
    const last = circuit.size - 1;
    return [
      {
        value: circuit.inductive ? (y) => y[last]! : (y, t) => (circuit.follows ? circuit.followingCurrent(y, t) : circuit.drive(y, t, s)),
        rising: false,
        apply: () => {
          circuit.conduction = 0;
          this.y[last] = 0;
          this.onBlocked();
        },
      },
    ];
  }
}
