import type { Circuit } from '../circuit/circuit';
import { DoubledStep } from '../solver/doubled-step';
import type { CycleMap } from './cycle-map';
import type { SteadyCycle } from './steady-cycle';

/** Why the soak handed back to the waveform. */
export type SoakEnd = 'time' | 'load-threshold' | 'fast-change' | 'no-cycle' | 'budget';

export interface SoakPoint {
  time: number;
  cycle: SteadyCycle;
  temperature: number[];
  energy: number[];
  i2t: number;
  source: number;
}

export interface SoakResult {
  end: SoakEnd;
  t: number;
  temperatures: Float64Array;
  cycle: SteadyCycle | null;
  body: Float64Array;
  given: Float64Array;
  i2t: number;
  source: number;
  points: SoakPoint[];
  sides: number;
}

export interface SoakSpan {
  from: number;
  to: number;
  /** s; the shortest stretch that the averaging means anything over. */
  period: number;
  tolerance: number;
  /** Bus thresholds that would start or stop the load; V. */
  startsAt: number | null;
  stopsAt: number | null;
}

/** Share by which a resistance may move within one period before the averaging no longer describes it. */
const FAST = 0.02;
const MOST_STEPS = 4000;
/** Thermal time constants in one step; further on step doubling would no longer see its own error. */
const LONGEST = 2;

/** Temperatures moved on by the heating averaged over the repeating cycle. */
export class Soak {
  private readonly count: number;
  private readonly temperatures: Float64Array;
  private readonly state: Float64Array;
  private missing = false;

  constructor(
    private readonly circuit: Circuit,
    private readonly map: CycleMap,
    temperatures: Float64Array,
  ) {
    this.count = circuit.count;
    this.temperatures = temperatures;
    this.state = new Float64Array(circuit.size);
  }

  private elementsResistance(temperatures: Float64Array): number {
    const { circuit, state } = this;
    state.set(temperatures, 1);
    return circuit.elementsResistance(state);
  }

  private cycleAt(temperatures: Float64Array): SteadyCycle | null {
    return this.map.at(this.elementsResistance(temperatures));
  }

  private bodyPower(k: number, temperatures: Float64Array, rms: number): number {
    this.state.set(temperatures, 1);
    return this.circuit.bodyPower(k, this.state, rms);
  }

  private given(k: number, temperature: number): number {
    return this.circuit.path.elements[k]!.dissipation * (temperature - this.circuit.path.ambient);
  }

  private derivative = (slope: Float64Array, temperatures: Float64Array): void => {
    const cycle = this.cycleAt(temperatures);
    if (!cycle) this.missing = true;
    for (let k = 0; k < this.count; k += 1) {
      const power = cycle ? this.bodyPower(k, temperatures, cycle.rms) : 0;
      slope[k] = (power - this.given(k, temperatures[k]!)) / this.circuit.path.elements[k]!.heatCapacity;
    }
  };

  run(span: SoakSpan): SoakResult {
    const { count, temperatures } = this;
    const stepper = new DoubledStep(count, this.derivative);
    const floor = new Float64Array(count).fill(20);
    const result: SoakResult = {
      end: 'time', t: span.from, temperatures, cycle: this.cycleAt(temperatures), body: new Float64Array(count),
      given: new Float64Array(count), i2t: 0, source: 0, points: [], sides: 0,
    };
    const [before, zero] = [new Float64Array(count), new Float64Array(count)];
    const longest = LONGEST * Math.min(...this.circuit.path.elements.map(({ heatCapacity, dissipation }) => heatCapacity / dissipation));
    let h = Math.min(span.to - span.from, 20 * span.period);
    while (result.t < span.to - 1e-9 && result.end === 'time') {
      if (!result.cycle) return { ...result, end: 'no-cycle' };
      if (result.sides > 12 * MOST_STEPS) return { ...result, end: 'budget' };
      h = Math.min(h, longest, span.to - result.t);
      before.set(temperatures);
      stepper.take(before, result.t, h);
      result.sides += 12;
      const error = stepper.error(floor, span.tolerance, zero);
      if (this.missing) return { ...result, end: 'no-cycle' };
      if (error > 1 && h > span.period) {
        h = Math.max(span.period, h * Math.max(0.2, 0.9 * error ** -0.25));
        continue;
      }
      stepper.extrapolate();
      if (this.isFast(before, stepper.end, (h / span.period))) return { ...result, end: 'fast-change' };
      this.accept(result, h, before, stepper);
      result.end = this.crossing(result.cycle, span) ?? 'time';
      h *= Math.min(3, Math.max(1, 0.9 * Math.max(error, 1e-9) ** -0.2));
    }
    return result;
  }

  private isFast(before: Float64Array, after: Float64Array, periods: number): boolean {
    const change = Math.abs(Math.log(this.elementsResistance(after) / this.elementsResistance(before)));
    return change / Math.max(1, periods) > FAST;
  }

  private crossing(cycle: SteadyCycle | null, { startsAt, stopsAt }: SoakSpan): SoakEnd | null {
    if (!cycle) return 'no-cycle';
    if (startsAt !== null && cycle.highestBus >= startsAt) return 'load-threshold';
    return stopsAt !== null && cycle.lowestBus <= stopsAt ? 'load-threshold' : null;
  }

  private accept(result: SoakResult, h: number, before: Float64Array, stepper: DoubledStep): void {
    const { count, temperatures } = this;
    const instants = [before, stepper.middle, stepper.end].map((at) => ({ at, cycle: this.cycleAt(at) ?? result.cycle! }));
    const weights = [h / 6, (4 * h) / 6, h / 6];
    instants.forEach(({ at, cycle }, n) => {
      result.i2t += weights[n]! * cycle.rms ** 2;
      result.source += weights[n]! * cycle.sourcePower;
      for (let k = 0; k < count; k += 1) {
        result.body[k]! += weights[n]! * this.bodyPower(k, at, cycle.rms);
        result.given[k]! += weights[n]! * this.given(k, at[k]!);
      }
    });
    temperatures.set(stepper.end);
    result.t += h;
    result.cycle = instants[2]!.cycle;
    result.points.push({
      time: result.t, cycle: result.cycle, temperature: Array.from(temperatures), energy: Array.from(result.body), i2t: result.i2t, source: result.source,
    });
  }
}
