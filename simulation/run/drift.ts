import type { Circuit } from '../circuit/circuit';
import { twinOf } from '../circuit/twin';
import { DoubledStep } from '../solver/doubled-step';
import { Periods } from './periods';
import type { Period } from './recorder';
import type { SoakPoint } from './soak';
import { Waveform } from './waveform';

/** Where a drift ended, and what had been absorbed on the way; SI. */
export interface DriftResult {
  t: number;
  bus: number;
  temperatures: Float64Array;
  body: number[];
  given: number[];
  i2t: number;
  source: number;
  points: SoakPoint[];
  sides: number;
}

export interface DriftSpan {
  from: number;
  to: number;
  /** Bus voltages that something happens at on the way up and on the way down; V. */
  rising: readonly number[];
  falling: readonly number[];
  tolerance: number;
}

interface Section {
  end: Float64Array;
  row: Period;
  given: number[];
}

/** Periods below which a step costs more than the waveform itself. */
const SHORTEST = 60;
/** Share of a threshold within which the waveform takes over. */
const NEAR = 0.015;
/** Distance of the bus from where it comes to rest, over the source amplitude, at which it no longer drifts. */
const RESTS = 5e-4;
/** Time constants of the bus in one step. */
const LONGEST = 4;
const BUDGET = 600_000;
const TOLERANCE = 1e-5;

/**
 * Bus and temperatures that move little from one half period to the next, moved on over many at once: the change
 * over two half periods, taken as they are, gives the slope of the envelope, d z/d n = (3·g₀ − g₁)/2 with g the change
 * over each. Source of the method: envelope following (multirevolution), Petzold, SIAM J. Numer. Anal. 18 (1981), from memory.
 */
export class Drift {
  private readonly period: number;
  private missing = false;
  /** Change of the bus in one period at the begin and at the end of the last step, V. */
  private rates: [number, number] = [0, 0];
  private sides = 0;

  constructor(private readonly circuit: Circuit) {
    this.period = 0.5 / circuit.path.source.frequency;
  }

  private halfPeriod(bus: number, temperatures: Float64Array): Section | null {
    const twin = twinOf(this.circuit);
    const wave = new Waveform(twin, { t: 0, y: Float64Array.of(bus, ...temperatures, 0) }, { tolerance: TOLERANCE, budget: 100_000 }, () => [], () => periods.add());
    const periods = new Periods(wave);
    wave.run(periods.length, () => false);
    this.sides += wave.sides;
    if (wave.stoppedAs || twin.conduction !== 0) return null;
    periods.cut();
    return { end: wave.y, row: periods.rows[0]!, given: Array.from(wave.tally.given) };
  }

  private derivative = (slope: Float64Array, z: Float64Array): void => {
    const first = this.halfPeriod(z[0]!, z.subarray(1));
    const second = first && this.halfPeriod(first.end[0]!, first.end.subarray(1, z.length));
    if (!first || !second) {
      this.missing = true;
      slope.fill(0);
      return;
    }
    for (let k = 0; k < z.length; k += 1) {
      const [g0, g1] = [first.end[k]! - z[k]!, second.end[k]! - first.end[k]!];
      slope[k] = (1.5 * g0 - 0.5 * g1) / this.period;
    }
  };

  /** Null where the path does not drift slowly enough to gain anything. */
  run(bus: number, temperatures: Float64Array, span: DriftSpan): DriftResult | null {
    const { period, circuit } = this;
    const amplitude = circuit.path.source.amplitude;
    const stepper = new DoubledStep(1 + temperatures.length, this.derivative);
    const floor = Float64Array.of(0.2 * amplitude, ...Array.from(temperatures, () => 20));
    const z = Float64Array.of(bus, ...temperatures);
    const origin = new Float64Array(z.length);
    const result: DriftResult = { t: span.from, bus, temperatures, body: [...temperatures].fill(0), given: [...temperatures].fill(0), i2t: 0, source: 0, points: [], sides: 0 };
    let h = 2 * SHORTEST * period;
    for (;;) {
      h = Math.floor(Math.min(h, span.to - result.t) / period + 1e-6) * period;
      if (h < SHORTEST * period || this.sides > BUDGET) break;
      origin.set(z);
      stepper.take(z, result.t, h);
      const error = stepper.error(floor, span.tolerance, origin);
      if (this.missing) break;
      if (error > 1) {
        h *= Math.max(0.2, 0.9 * error ** -0.25);
        continue;
      }
      stepper.extrapolate();
      if (!this.accept(result, h, z, stepper, span)) break;
      z.set(stepper.end);
      const { distance, timeConstant } = this.relaxation(h);
      if (distance < RESTS * amplitude) break;
      h = Math.min(LONGEST * timeConstant, h * Math.min(3, Math.max(1, 0.9 * Math.max(error, 1e-9) ** -0.2)));
    }
    result.sides = this.sides;
    return result.points.length > 0 ? result : null;
  }

  /** How far the bus still is from its rest and how fast it gets there, from its rates at both ends of a step. */
  private relaxation(h: number): { distance: number; timeConstant: number } {
    const [before, after] = this.rates;
    if (after === 0) return { distance: 0, timeConstant: Infinity };
    const decay = Math.log(Math.abs(before / after));
    const timeConstant = decay > 0 ? h / decay : Infinity;
    return { distance: (Math.abs(after) / this.period) * timeConstant, timeConstant };
  }

  /** False where the step would pass something that happens on the waveform. */
  private accept(result: DriftResult, h: number, z: Float64Array, stepper: DoubledStep, span: DriftSpan): boolean {
    const instants = [z, stepper.middle, stepper.end].map((at) => this.halfPeriod(at[0]!, at.subarray(1)));
    const [a, b, c] = instants;
    if (!a || !b || !c) return false;
    if (span.rising.some((one) => a.row.highestBus < one && c.row.highestBus > (1 - NEAR) * one)) return false;
    if (span.falling.some((one) => a.row.lowestBus > one && c.row.lowestBus < (1 + NEAR) * one)) return false;
    this.rates = [a.end[0]! - z[0]!, c.end[0]! - stepper.end[0]!];
    const mean = (pick: (section: Section) => number) => (h / 6) * (pick(a) + 4 * pick(b) + pick(c));
    result.i2t += mean(({ row }) => row.rms ** 2);
    result.source += mean(({ row }) => row.sourcePower);
    result.body.forEach((_, k) => {
      result.body[k]! += mean(({ row }) => row.bodyPower[k]!);
      result.given[k]! += mean(({ given }) => given[k]! / this.period);
    });
    result.t += h;
    result.bus = stepper.end[0]!;
    result.temperatures = Float64Array.from(stepper.end.subarray(1));
    result.points.push({
      time: result.t,
      cycle: { ...c.row, capacitorVoltage: result.bus, lineCurrent: 0 },
      temperature: Array.from(result.temperatures),
      energy: [...result.body],
      i2t: result.i2t,
      source: result.source,
    });
    return true;
  }
}
