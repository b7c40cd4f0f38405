import type { Run, Stopped } from '../../shared/model/result';
import type { PowerPath } from '../circuit/path';
import { auditOf } from './audit';
import { elementFiguresOf, figuresOf } from './figures';
import { Follow } from './follow';
import type { RunOptions } from './options';
import { remarksOf } from './remarks';
import { emptyTraces, tracesOf } from './traces';

/** Where a run ended; what a restart begins with. */
export interface FinalState {
  /** K */
  temperatures: number[];
  busVoltage: number;
  contactsClosed: boolean[];
  loadRuns: boolean;
}

export interface PowerUp {
  run: Run;
  final: FinalState;
  /** Right-hand sides evaluated, on the waveform scale and for the soak's own temperatures. */
  sides: number;
}

const ADVICE = {
  'step-too-small': 'The equations change too fast to follow here. Look at the heat capacity of the limiter and at the source inductance.',
  'step-budget': 'The run takes more steps than allowed. Shorten it, or look for a resistance, capacitance or inductance far from the others.',
} as const;

const stoppedOf = ({ wave, path }: Follow): Stopped | null => {
  const reason = wave.stoppedAs;
  if (!reason) return null;
  return { reason, at: wave.t, place: path.elements.length > 0 ? 'limiter.0.part.thermal' : 'bulk.capacitance', advice: ADVICE[reason] };
};

/**
 * Integrates one power-up path from switch-on: waveform, soak and back as events ask, with figures, events, traces
 * and self-audit. Source of the method: event-located Runge–Kutta of fourth order; cycle averaging for the soak.
 */
export const powerUp = (path: PowerPath, options: RunOptions): PowerUp => {
  const follow = new Follow(path, options);
  const { wave, circuit } = follow;
  return {
    run: {
      stopped: stoppedOf(follow),
      figures: figuresOf(follow),
      elements: elementFiguresOf(follow),
      events: follow.eventsInOrder(),
      traces: options.traces === false ? emptyTraces(circuit.count) : tracesOf(follow),
      audit: auditOf(follow),
      remarks: remarksOf(follow),
    },
    final: {
      temperatures: Array.from(wave.y.subarray(1, 1 + circuit.count)),
      busVoltage: follow.endCycle?.lowestBus ?? wave.y[0]!,
      contactsClosed: [...circuit.closed],
      loadRuns: circuit.loadSince !== null,
    },
    sides: wave.sides + follow.soakSides,
  };
};
