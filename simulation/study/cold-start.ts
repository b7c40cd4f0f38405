import { coldStartHoldCheck } from '../checks/cold-start-hold';
import { coldStartReachCheck, NO_COLD_FIGURES } from '../checks/cold-start-reach';
import type { Scenario } from '../../shared/model/scenario';
import { findingOf, orNever, type Studied } from './studied';
import { searchSteady } from './steady';
import { UNLOADED, type Trials } from './trials';
import type { Situation } from './worst-case';

const FREEZING = 273.15;

const coldCautions = ({ ambient, bulk }: Scenario): string[] =>
  ambient.min < FREEZING && !bulk.atLowAmbient ? [NO_COLD_FIGURES] : [];

/** The bus with the load still off. */
const studyReach = (trials: Trials, startVoltage: number): Studied => {
  const reached = (one: Situation): number | null => trials.charge(one, UNLOADED).figures.highestBus;
  const found = searchSteady(trials, (levels, phase) => -(reached({ levels, phase }) ?? Infinity));
  const finding = findingOf(trials, found, reached, false);
  return { check: coldStartReachCheck(finding, startVoltage, coldCautions(trials.scenario), trials.scenario.cautionBelow), situation: null };
};

/** The bus once the load draws on it. */
const studyHold = (trials: Trials, stopVoltage: number): Studied => {
  const lowest = (one: Situation): number | null => trials.whole(one).run.figures.lowestBusUnderLoad;
  const starts = (one: Situation): number => trials.whole(one).run.figures.loadStarts ?? 0;
  const found = searchSteady(trials, (levels, phase) => {
    const one = { levels, phase };
    // A load that never starts, or starts again and again, is worse than any voltage.
    return starts(one) === 0 ? Infinity : -orNever(lowest(one)) + (starts(one) > 1 ? 1e4 : 0);
  });
  const check = coldStartHoldCheck(
    { finding: findingOf(trials, found, lowest, false), stopVoltage, starts: starts(found.worst) },
    coldCautions(trials.scenario),
    trials.scenario.cautionBelow,
  );
  return { check, situation: found.worst };
};

/** Whether a converter with a start voltage starts and keeps running; any other load has no threshold to reach. */
export const studyColdStart = (trials: Trials): Studied[] => {
  const { load } = trials.scenario;
  if (load.kind !== 'constant-power') return [];
  const path = trials.path({}, 0).load;
  const stopVoltage = path.kind === 'constant-power' ? path.stopVoltage : 0;
  return [studyReach(trials, load.startVoltage), studyHold(trials, stopVoltage)];
};
