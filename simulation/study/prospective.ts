import { fuseBreakingCapacityCheck } from '../checks/fuse-breaking-capacity';
import { levelOf, type Levels } from './levels';
import { frequencyAt, voltageAt } from './resolve-path';
import { prospectiveCurrent } from './source-impedance';
import { findingAtLevels, type Studied } from './studied';
import type { Trials } from './trials';

/** The corner of the highest prospective current: highest line, lowest impedance and frequency. */
export const STRONGEST: Levels = { line: 'high', sourceImpedance: 'low', frequency: 'low' };

/** Prospective current (A rms; DC: A) of the source alone at a corner. */
export const prospectiveAt =
  ({ scenario }: Trials) =>
  (levels: Levels): number | null =>
    prospectiveCurrent(
      scenario.source,
      levelOf(levels, 'sourceImpedance'),
      voltageAt(scenario, levels).rms,
      frequencyAt(scenario, levelOf(levels, 'frequency')),
    );

/** Breaking capacity of the fuse. */
export const studyBreakingCapacity = (trials: Trials): Studied[] => {
  const { fuse, cautionBelow } = trials.scenario;
  if (!fuse) return [];
  const found = findingAtLevels(trials, STRONGEST, prospectiveAt(trials));
  return [{ check: fuseBreakingCapacityCheck(found, fuse, cautionBelow), situation: null }];
};
