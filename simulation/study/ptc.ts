import { foldCurrent } from '../checks/fold-current';
import { ptcHoldCheck } from '../checks/ptc-hold';
import { ptcInrushCheck } from '../checks/ptc-inrush';
import { ptcMaximumCurrentCheck } from '../checks/ptc-maximum-current';
import { ptcMaximumVoltageCheck } from '../checks/ptc-maximum-voltage';
import { ptcVoltageDropCheck } from '../checks/ptc-voltage-drop';
import type { Element } from '../../shared/model/limiter';
import type { Levels } from './levels';
import { prospectiveAt, STRONGEST } from './prospective';
import { ambientAt, voltageAt } from './resolve-path';
import { searchSteady, steadyRms } from './steady';
import { findingAtLevels, findingOf, orNever, searchWorst, type Studied } from './studied';
import type { Trials } from './trials';
import { studyTrip } from './trip';
import type { Situation, WorstCase } from './worst-case';

/** Holding is hardest in the hottest ambient with the highest resistance. */
const WEAKEST_HOLD: Levels = { ambient: 'high', elementResistance: 'high' };

export const foldAt =
  (trials: Trials, index: number) =>
  (levels: Levels): number => {
    const path = trials.path(levels, 0);
    const element = path.elements[index];
    return element ? foldCurrent(element, path.ambient).current : 0;
  };

const studyHold = (trials: Trials, index: number): Studied => {
  const { limits, cautionBelow } = trials.scenario;
  const stated = limits.steadyCurrent;
  const found = searchSteady(trials, (levels, phase) => orNever(steadyRms(trials, { levels, phase })));
  const operating =
    stated === undefined
      ? { worst: steadyRms(trials, found.worst), nominal: steadyRms(trials, found.nominal) }
      : { worst: stated, nominal: stated };
  const finding = findingAtLevels(trials, WEAKEST_HOLD, foldAt(trials, index));
  return { check: ptcHoldCheck(index, finding, operating, stated !== undefined, cautionBelow), situation: null };
};

/** Body temperature (K) at which R is ten times that at `start` (K). */
const tripTemperature = (trials: Trials, index: number, { levels, phase }: Situation, start: number): number | null => {
  const law = trials.path(levels, phase).elements[index]?.law;
  return law ? law.temperature(10 * law.resistance(start)) : null;
};

/** The hottest that charging makes the body: from cold, and from its steady temperature with the bus empty. */
const chargingPeak = (trials: Trials, index: number, one: Situation): number | null => {
  const cold = trials.charge(one).elements[index];
  const { temperatures } = trials.whole({ levels: one.levels, phase: Math.PI / 2 }).final;
  const contactsClosedFor = temperatures.map(() => null);
  const hot = trials.from(one, { temperatures, busVoltage: 0, contactsClosedFor }, 'charged').elements[index];
  if (!cold || !hot) return null;
  return Math.max(cold.chargePeakTemperature ?? cold.peakTemperature, hot.chargePeakTemperature ?? hot.peakTemperature);
};

const studyInrush = (trials: Trials, index: number): Studied => {
  const { scenario } = trials;
  const tripAt = (one: Situation) => tripTemperature(trials, index, one, ambientAt(scenario, one.levels));
  const coldPeak = (one: Situation): number => {
    const element = trials.charge(one).elements[index];
    return orNever(element?.chargePeakTemperature ?? element?.peakTemperature);
  };
  const found: WorstCase = searchWorst(trials, (levels, phase) => {
    const [one, ambient] = [{ levels, phase }, ambientAt(scenario, levels)];
    return (coldPeak(one) - ambient) / Math.max((tripAt(one) ?? Infinity) - ambient, 1e-9);
  });
  const check = ptcInrushCheck(
    {
      element: index,
      finding: findingOf(trials, found, (one) => chargingPeak(trials, index, one)),
      tripTemperature: { worst: tripAt(found.worst), nominal: tripAt(found.nominal) },
      ambient: { worst: ambientAt(scenario, found.worst.levels), nominal: scenario.ambient.nominal },
    },
    scenario.cautionBelow,
  );
  return { check, situation: found.worst };
};

const studyMaxima = (trials: Trials, index: number, { part }: Element): Studied[] => {
  const { scenario } = trials;
  const { maximumCurrent, maximumVoltage } = part.ratings;
  const current = findingAtLevels(trials, STRONGEST, prospectiveAt(trials));
  const voltage = findingAtLevels(trials, { line: 'high' }, (levels) => voltageAt(scenario, levels).rms);
  return [
    { check: ptcMaximumCurrentCheck(index, current, maximumCurrent, scenario.cautionBelow), situation: null },
    { check: ptcMaximumVoltageCheck(index, voltage, maximumVoltage, scenario.cautionBelow), situation: null },
  ];
};

const studyDrop = (trials: Trials, index: number): Studied[] => {
  const { limits, cautionBelow } = trials.scenario;
  if (limits.voltageDrop === undefined) return [];
  const at = (one: Situation): number | null => {
    const element = trials.whole(one).run.elements[index];
    return element && element.steadyRmsCurrent !== null ? element.steadyRmsCurrent * element.finalResistance : null;
  };
  const found = searchSteady(trials, (levels, phase) => orNever(at({ levels, phase })));
  return ptcVoltageDropCheck(index, findingOf(trials, found, at, false), limits.voltageDrop, cautionBelow).map((check) => ({
    check,
    situation: found.worst,
  }));
};

/** What a polymer PTC must do: hold in operation, not trip on the inrush, trip on the fault, and stand the supply. */
export const studyPtc = (trials: Trials): Studied[] =>
  trials.scenario.limiter.flatMap((element, index) =>
    element.part.kind === 'polymer-ptc'
      ? [
          studyHold(trials, index),
          studyInrush(trials, index),
          ...studyTrip(trials, index, foldAt(trials, index)),
          ...studyMaxima(trials, index, element),
          ...studyDrop(trials, index),
        ]
      : [],
  );
