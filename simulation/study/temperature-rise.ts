import { ambientAt } from './resolve-path';
import type { Trials } from './trials';
import type { Situation } from './worst-case';

/** Rise over ambient as a share of the rise allowed; without a maximum the temperature itself (K), so that the hottest is found. */
export const riseUse = (temperature: number | null, ambient: number, maximum: number | undefined): number => {
  if (temperature === null) return -Infinity;
  return maximum === undefined ? temperature : (temperature - ambient) / Math.max(maximum - ambient, 1e-9);
};

/** Whether an element left the range that its law was given for: hotter than it, or colder at the ambient. */
export const isExtrapolated = (trials: Trials, index: number, one: Situation, temperature: number | null): boolean => {
  const valid = trials.path(one.levels, one.phase).elements[index]?.law.valid;
  return valid !== undefined && temperature !== null && (temperature > valid.max || ambientAt(trials.scenario, one.levels) < valid.min);
};
