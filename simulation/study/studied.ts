import type { Finding } from '../checks/judge';
import type { Check } from '../../shared/model/check';
import type { Scenario } from '../../shared/model/scenario';
import { cornerOf } from './factors';
import type { Levels } from './levels';
import type { Trials } from './trials';
import { worstCase, type Objective, type Situation, type WorstCase } from './worst-case';

/** A check with the situation that governs it, for the envelope. */
export interface Studied {
  check: Check;
  situation: Situation | null;
}

const DEGREE = Math.PI / 180;

/** The switch-on angle (rad) to use as given; null where it is to be searched. DC has none: 0. */
export const givenPhase = ({ source }: Scenario): number | null => {
  if (source.kind === 'dc') return 0;
  return source.phase === 'worst' ? null : source.phase * DEGREE;
};

/** Searches the worst corner, and the angle as well where it is not given or held. */
export const searchWorst = (trials: Trials, objective: Objective, held?: number): WorstCase =>
  worstCase({ ranges: trials.ranges, objective, phase: givenPhase(trials.scenario) ?? held ?? null });

/** Degrees to a tenth, as reported. */
export const roundedDegrees = (phase: number): number => Math.round((phase / DEGREE) * 10) / 10;

/** `value` in the worst and the nominal situation, with the worst one's corner and angle. */
export const findingOf = (
  trials: Trials,
  { worst, nominal }: WorstCase,
  value: (situation: Situation) => number | null,
  phaseEnters = true,
): Finding => ({
  value: value(worst),
  nominal: value(nominal),
  corner: cornerOf(trials.ranges, worst.levels),
  phase: phaseEnters && trials.scenario.source.kind === 'ac' ? roundedDegrees(worst.phase) : null,
  offTime: null,
});

/** `value` at a corner that needs no search and no angle. */
export const findingAtLevels = (trials: Trials, worst: Levels, value: (levels: Levels) => number | null): Finding => ({
  value: value(worst),
  nominal: value({}),
  corner: cornerOf(trials.ranges, worst),
  phase: null,
  offTime: null,
});

/** An answer that is absent never wins a search. */
export const orNever = (value: number | null | undefined): number => value ?? -Infinity;
