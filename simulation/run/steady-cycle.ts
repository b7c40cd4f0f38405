import { Circuit } from '../circuit/circuit';
import type { PowerPath } from '../circuit/path';
import { fixedLaw } from '../laws/fixed';
import { Periods } from './periods';
import type { Period } from './recorder';
import { Waveform } from './waveform';

/** The line cycle that repeats itself while the elements together hold one resistance; SI. */
export interface SteadyCycle {
  rms: number;
  peak: number;
  lowestBus: number;
  highestBus: number;
  sourcePower: number;
  /** State at the zero of the source voltage. */
  capacitorVoltage: number;
  lineCurrent: number;
}

export interface CycleOptions {
  path: PowerPath;
  loadRuns: boolean;
  faulted: boolean;
  tolerance: number;
}

/** V over amplitude; a cycle that returns this closely repeats. */
const RETURNS = 2e-6;
const MOST_CYCLES = 60;
/** Share of the amplitude within which the fixed point lies. */
const DISTANCE = 2e-4;
/** Gaps that a second guess is away where the first gap is small, so that the slope between them means something. */
const FAR = 50;

const frozen = ({ path, loadRuns, faulted }: CycleOptions, resistance: number): Circuit => {
  const element = { name: '', kind: 'resistor' as const, law: fixedLaw(resistance), dissipation: 1, heatCapacity: Infinity, bypass: null };
  const circuit = new Circuit({ ...path, source: { ...path.source, phase: 0, programme: [] }, elements: [element] });
  circuit.faulted = faulted;
  circuit.loadSince = loadRuns ? -Infinity : null;
  return circuit;
};

interface Section {
  v: number;
  i: number;
  row: Period;
}

const halfCycle = (options: CycleOptions, resistance: number, v: number, i: number): Section | null => {
  const circuit = frozen(options, resistance);
  const y = Float64Array.of(v, options.path.ambient, i);
  if (i > 0) {
    circuit.conduction = -1;
    circuit.inductive = circuit.needsInductance(y, false);
  }
  const wave = new Waveform(circuit, { t: 0, y }, { tolerance: options.tolerance, budget: 200_000 }, () => [], () => periods.add());
  const periods = new Periods(wave);
  wave.run(periods.length, () => false);
  if (wave.stoppedAs) return null;
  periods.cut();
  return { v: wave.y[0]!, i: circuit.conduction === 0 ? 0 : Math.abs(circuit.lineCurrent(wave.y, wave.t)), row: periods.rows[0]! };
};

const cycleOf = ({ v, i, row }: Section): SteadyCycle => ({
  rms: row.rms,
  peak: row.peak,
  lowestBus: row.lowestBus,
  highestBus: row.highestBus,
  sourcePower: row.sourcePower,
  capacitorVoltage: v,
  lineCurrent: i,
});

/**
 * Fixed point of the map of one half cycle on the capacitor voltage at the zero of the source voltage, by a secant;
 * where current crosses that zero, by repetition. Null where the cycle does not settle.
 */
export const steadyCycle = (options: CycleOptions, resistance: number, guess: number): SteadyCycle | null => {
  const near = RETURNS * options.path.source.amplitude;
  let [v, i] = [guess, 0];
  let previous: { v: number; gap: number } | null = null;
  for (let k = 0; k < MOST_CYCLES; k += 1) {
    const section = halfCycle(options, resistance, v, i);
    if (!section) return null;
    const gap = section.v - v;
    const slope: number = previous && i === 0 && section.i === 0 && v !== previous.v ? (gap - previous.gap) / (v - previous.v) : 0;
    const steep = slope < -1e-6;
    // A bus of a long time constant moves little in one cycle while it is still far away: the distance counts as well.
    const arrived = !steep || Math.abs(gap / slope) < DISTANCE * options.path.source.amplitude;
    if (Math.abs(gap) < near && arrived && (previous || gap === 0) && Math.abs(section.i - i) <= 1e-4 * section.row.peak) return cycleOf(section);
    const first = previous === null;
    previous = { v, gap };
    if (steep) v -= gap / slope;
    else v = first && Math.abs(gap) < near ? v + FAR * gap : section.v;
    v = Math.min(Math.max(v, 0), options.path.source.amplitude);
    i = section.i;
  }
  return null;
};
