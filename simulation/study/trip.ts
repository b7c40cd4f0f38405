import { ptcSourceCapabilityCheck } from '../checks/ptc-source-capability';
import { ptcTimeToTripCheck } from '../checks/ptc-time-to-trip';
import { finding } from '../checks/judge';
import { levelOf, type Levels } from './levels';
import { frequencyAt, voltageAt } from './resolve-path';
import { impedanceAt } from './source-impedance';
import { findingAtLevels, findingOf, type Studied } from './studied';
import { searchSteady } from './steady';
import { FAULTED, type Trials } from './trials';
import type { Situation } from './worst-case';

/** A trip is slowest, and may never come, in the coldest ambient with the lowest resistance and the weakest source. */
const WEAKEST_TRIP: Levels = { line: 'low', ambient: 'low', elementResistance: 'low', sourceImpedance: 'high', frequency: 'high' };

/**
 * Current (A rms; DC: A) that the source drives into the fault, or into a dead short where none is stated,
 * through its own impedance and every cold element; diode drops and contacts are left out.
 */
const faultCurrent =
  (trials: Trials) =>
  (levels: Levels): number | null => {
    const { scenario } = trials;
    const path = trials.path(levels, 0, FAULTED);
    const frequency = frequencyAt(scenario, levelOf(levels, 'frequency'));
    const { resistance, inductance } = impedanceAt(scenario.source, levelOf(levels, 'sourceImpedance'), frequency);
    const elements = path.elements.reduce((sum, { law }) => sum + law.resistance(path.ambient), 0);
    const total = Math.hypot(resistance + (scenario.fuse?.resistance ?? 0) + elements + (path.fault?.resistance ?? 0), 2 * Math.PI * frequency * inductance);
    return total > 0 ? voltageAt(scenario, levels).rms / total : null;
  };

const studyCapability = (trials: Trials, index: number, fold: (levels: Levels) => number): Studied => {
  const { fault, cautionBelow } = trials.scenario;
  const current = findingAtLevels(trials, WEAKEST_TRIP, faultCurrent(trials));
  const folds = { worst: fold(WEAKEST_TRIP), nominal: fold({}) };
  return { check: ptcSourceCapabilityCheck(index, current, folds, fault !== undefined, cautionBelow), situation: null };
};

const studyTime = (trials: Trials, index: number): Studied => {
  const { fault, limits, cautionBelow, duration } = trials.scenario;
  const base = { element: index, allowed: limits.timeToTrip, faultStated: fault !== undefined };
  if (!fault) return { check: ptcTimeToTripCheck({ ...base, finding: finding(null, null), neverTrips: false }, cautionBelow), situation: null };
  const timeToTrip = (one: Situation): number | null => {
    const { trippedAt } = trials.whole(one, FAULTED).run.elements[index] ?? { trippedAt: null };
    return trippedAt === null ? null : trippedAt - fault.at;
  };
  const found = searchSteady(trials, (levels, phase) => timeToTrip({ levels, phase }) ?? duration);
  const slowest = findingOf(trials, found, timeToTrip, false);
  const check = ptcTimeToTripCheck({ ...base, finding: slowest, neverTrips: slowest.value === null }, cautionBelow);
  return { check, situation: null };
};

/** Whether, and how fast, the element trips on the fault. */
export const studyTrip = (trials: Trials, index: number, fold: (levels: Levels) => number): Studied[] => [
  studyCapability(trials, index, fold),
  studyTime(trials, index),
];
