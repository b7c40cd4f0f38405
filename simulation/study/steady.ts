import { fuseSteadyCurrentCheck } from '../checks/fuse-steady-current';
import { limiterLossCheck } from '../checks/limiter-loss';
import { deratedCurrent, limiterSteadyCurrentCheck } from '../checks/limiter-steady-current';
import { limiterSteadyTemperatureCheck } from '../checks/limiter-steady-temperature';
import type { Part } from '../../shared/model/part';
import { applies } from './applicable';
import { ambientAt } from './resolve-path';
import { findingOf, orNever, searchWorst, type Studied } from './studied';
import { isExtrapolated, riseUse } from './temperature-rise';
import type { Trials } from './trials';
import type { Objective, Situation, WorstCase } from './worst-case';

/** Thermal balance does not depend on the switch-on angle: one angle serves all corners. */
const HELD_PHASE = Math.PI / 2;

export const searchSteady = (trials: Trials, objective: Objective): WorstCase => searchWorst(trials, objective, HELD_PHASE);

const ambients = (trials: Trials, { worst, nominal }: WorstCase) => ({
  worst: ambientAt(trials.scenario, worst.levels),
  nominal: ambientAt(trials.scenario, nominal.levels),
});

export const steadyRms = (trials: Trials, one: Situation): number | null => trials.whole(one).run.figures.steadyRmsCurrent;

const studyFuse = (trials: Trials): Studied[] => {
  const { fuse, cautionBelow } = trials.scenario;
  if (!fuse) return [];
  const found = searchSteady(trials, (levels, phase) => orNever(steadyRms(trials, { levels, phase })));
  const finding = findingOf(trials, found, (one) => steadyRms(trials, one), false);
  return [{ check: fuseSteadyCurrentCheck(finding, fuse, cautionBelow), situation: found.worst }];
};

const studyTemperature = (trials: Trials, index: number, { ratings }: Part): Studied => {
  const at = (one: Situation): number | null => trials.whole(one).run.elements[index]?.finalTemperature ?? null;
  const found = searchSteady(trials, (levels, phase) =>
    riseUse(at({ levels, phase }), ambientAt(trials.scenario, levels), ratings.maximumTemperature),
  );
  const finding = findingOf(trials, found, at, false);
  const one = {
    element: index,
    finding,
    ambient: ambients(trials, found),
    maximum: ratings.maximumTemperature,
    extrapolated: isExtrapolated(trials, index, found.worst, finding.value),
  };
  return { check: limiterSteadyTemperatureCheck(one, trials.scenario.cautionBelow), situation: found.worst };
};

const studyCurrent = (trials: Trials, index: number, { ratings }: Part): Studied => {
  const at = (one: Situation): number | null => trials.whole(one).run.elements[index]?.steadyRmsCurrent ?? null;
  const allowed = (ambient: number): number => {
    const rating = ratings.steadyCurrent && deratedCurrent(ratings.steadyCurrent, ambient, ratings.maximumTemperature).current;
    return Math.max(rating ?? 1, 1e-9);
  };
  const found = searchSteady(trials, (levels, phase) => orNever(at({ levels, phase })) / allowed(ambientAt(trials.scenario, levels)));
  const finding = findingOf(trials, found, at, false);
  const check = limiterSteadyCurrentCheck({ element: index, finding, ambient: ambients(trials, found), ratings }, trials.scenario.cautionBelow);
  return { check, situation: found.worst };
};

const studyLoss = (trials: Trials): Studied[] => {
  const { limits, limiter, cautionBelow } = trials.scenario;
  if (limits.limiterLoss === undefined || limiter.length === 0) return [];
  const at = (one: Situation): number | null => trials.whole(one).run.figures.limiterLoss;
  const found = searchSteady(trials, (levels, phase) => orNever(at({ levels, phase })));
  return limiterLossCheck(findingOf(trials, found, at, false), limits.limiterLoss, cautionBelow).map((check) => ({ check, situation: found.worst }));
};

/** Everything that holds at thermal balance: fuse, body temperature and current, loss. */
export const studySteady = (trials: Trials): Studied[] => [
  ...studyFuse(trials),
  ...trials.scenario.limiter.flatMap(({ part }, index) => [
    ...(applies('limiter-steady-temperature', part) ? [studyTemperature(trials, index, part)] : []),
    ...(applies('limiter-steady-current', part) ? [studyCurrent(trials, index, part)] : []),
  ]),
  ...studyLoss(trials),
];
