import { comparedEnergy, deratedEnergy } from '../checks/energy-rating';
import { limiterCapacitanceCheck } from '../checks/limiter-capacitance';
import { limiterEnergyCheck } from '../checks/limiter-energy';
import { limiterPeakTemperatureCheck } from '../checks/limiter-peak-temperature';
import type { Part } from '../../shared/model/part';
import { applies } from './applicable';
import { ambientAt, bulkAt, voltageAt } from './resolve-path';
import { isExtrapolated, riseUse } from './temperature-rise';
import { findingAtLevels, findingOf, orNever, searchWorst, type Studied } from './studied';
import type { Trials } from './trials';
import type { Situation } from './worst-case';

/** J absorbed by an element of a cold power-up, until the bus is charged, or in all where it never is. */
const absorbed = (trials: Trials, index: number, one: Situation): number | null => {
  const element = trials.charge(one).elements[index];
  return element ? (element.chargeEnergy ?? element.energy) : null;
};

const SETTLE = 1e-3;

/** K; highest until the bus is charged, or until a contact that closes by the clock has closed: the body waits for it. */
const powerUpPeak = (trials: Trials, index: number, one: Situation): number | null => {
  const closes = trials.scenario.limiter[index]?.bypass?.closes;
  const run = closes?.when === 'time' ? trials.until(closes.at + SETTLE, one) : trials.charge(one);
  const element = run.elements[index];
  if (!element) return null;
  return closes?.when === 'time' ? element.peakTemperature : (element.chargePeakTemperature ?? element.peakTemperature);
};

const studyEnergy = (trials: Trials, index: number, { ratings }: Part): Studied => {
  const { scenario } = trials;
  const { energy: rating, maximumTemperature } = ratings;
  const energyIn = (one: Situation): number | null =>
    comparedEnergy(rating?.basis ?? 'absorbed', {
      absorbed: absorbed(trials, index, one),
      capacitance: bulkAt(scenario, one.levels).capacitance,
      voltage: voltageAt(scenario, one.levels),
      busVoltage: 0,
    });
  const allowed = (one: Situation): number => (rating ? deratedEnergy(rating, ambientAt(scenario, one.levels), maximumTemperature) : 1);
  const found = searchWorst(trials, (levels, phase) => orNever(energyIn({ levels, phase })) / Math.max(allowed({ levels, phase }), 1e-9));
  const simulated = rating?.basis !== 'half-cv2-rms' && rating?.basis !== 'half-cv2-peak';
  const finding = findingOf(trials, found, energyIn, simulated);
  const start = { worst: ambientAt(scenario, found.worst.levels), nominal: scenario.ambient.nominal };
  return { check: limiterEnergyCheck({ element: index, finding, start, ratings }, scenario.cautionBelow), situation: found.worst };
};

const studyCapacitance = (trials: Trials, index: number, { ratings }: Part): Studied => {
  const { scenario } = trials;
  const worst = { line: 'high', capacitance: 'high', ambient: 'high' } as const;
  const finding = findingAtLevels(trials, worst, (levels) => bulkAt(scenario, levels).capacitance);
  const voltage = { worst: voltageAt(scenario, worst), nominal: voltageAt(scenario, {}) };
  return { check: limiterCapacitanceCheck(index, finding, ratings.capacitance, voltage, scenario.cautionBelow), situation: null };
};

const studyPeakTemperature = (trials: Trials, index: number, { ratings }: Part, energyPasses: boolean): Studied => {
  const { scenario } = trials;
  const peak = (one: Situation) => powerUpPeak(trials, index, one);
  const found = searchWorst(trials, (levels, phase) => riseUse(peak({ levels, phase }), ambientAt(scenario, levels), ratings.maximumTemperature));
  const finding = findingOf(trials, found, peak);
  const one = {
    element: index,
    finding,
    ambient: { worst: ambientAt(scenario, found.worst.levels), nominal: scenario.ambient.nominal },
    maximum: ratings.maximumTemperature,
    extrapolated: isExtrapolated(trials, index, found.worst, finding.value),
  };
  return { check: limiterPeakTemperatureCheck(one, energyPasses, scenario.cautionBelow), situation: found.worst };
};

/** Energy, capacitance and temperature of each limiter element while the bus is charged from cold. */
export const studyChargingHeat = (trials: Trials): Studied[] =>
  trials.scenario.limiter.flatMap(({ part }, index) => {
    const energy = applies('limiter-energy', part) ? [studyEnergy(trials, index, part)] : [];
    const capacitance = applies('limiter-capacitance', part) ? [studyCapacitance(trials, index, part)] : [];
    const energyPasses = energy.some(({ check }) => check.status === 'pass');
    const peak = applies('limiter-peak-temperature', part) ? [studyPeakTemperature(trials, index, part, energyPasses)] : [];
    return [...energy, ...capacitance, ...peak];
  });
