import { comparedEnergy, deratedEnergy } from '../checks/energy-rating';
import { limiterRestartEnergyCheck } from '../checks/limiter-restart-energy';
import type { Part } from '../../shared/model/part';
import { applies } from './applicable';
import { cornerOf } from './factors';
import type { Levels } from './levels';
import { offTimesOf } from './off-times';
import { bulkAt, voltageAt } from './resolve-path';
import { restartLevels, restartState, searchSoak, soakState, type SoakState } from './restart';
import { givenPhase, roundedDegrees, type Studied } from './studied';
import type { Trials } from './trials';
import { worstCase } from './worst-case';

/** Near the angle of the highest energy in the worked cases; the energy to the end of charging hardly depends on it. */
const HELD_PHASE = Math.PI / 3;
/** Every how many of the off-times of the peak curve is tried: energy is smooth in the time off. */
const STRIDE = 3;

interface EnergyPoint {
  offTime: number;
  /** J, in the quantity of the rating */
  energy: number;
  /** Body at the restart, K. */
  start: number;
  /** Energy over the rating at that temperature. */
  use: number;
}

/** ½CV² is no simulated quantity. */
const isSimulated = ({ energy }: Part['ratings']): boolean => energy?.basis !== 'half-cv2-rms' && energy?.basis !== 'half-cv2-peak';

const meterOf = (trials: Trials, index: number, { ratings }: Part, phase: number) => {
  const { energy: rating, maximumTemperature } = ratings;
  const basis = rating?.basis ?? 'absorbed';
  return (levels: Levels, soak: SoakState, offTime: number): EnergyPoint => {
    const start = restartState(trials, levels, soak, offTime);
      const element = isSimulated(ratings) ? trials.from({ levels, phase }, start, 'charged').elements[index] : undefined;
    const energy =
      comparedEnergy(basis, {
        absorbed: element ? (element.chargeEnergy ?? element.energy) : null,
        capacitance: bulkAt(trials.scenario, levels).capacitance,
        voltage: voltageAt(trials.scenario, levels),
        busVoltage: start.busVoltage,
      }) ?? 0;
    const temperature = start.temperatures[index] ?? 0;
    const allowed = rating ? deratedEnergy(rating, temperature, maximumTemperature) : 1;
    return { offTime, energy, start: temperature, use: energy / Math.max(allowed, 1e-9) };
  };
};

const highest = (points: readonly EnergyPoint[]): EnergyPoint => points.reduce((a, b) => (b.use > a.use ? b : a));

const studyElement = (trials: Trials, index: number, part: Part): Studied => {
  const { source, cautionBelow } = trials.scenario;
  const phase = givenPhase(trials.scenario) ?? HELD_PHASE;
  const meter = meterOf(trials, index, part, phase);
  const offTimes = offTimesOf(trials.path({}, phase)).filter((_, position, all) => position % STRIDE === 0 || position === all.length - 1);
  const worstAt = (levels: Levels): EnergyPoint => {
    const soak = soakState(trials, levels);
    return highest(offTimes.map((offTime) => meter(levels, soak, offTime)));
  };
  const nominal = worstAt({});
  const first = trials.ranges.length ? worstAt(restartLevels(trials, {})) : nominal;
  const { worst } = worstCase({
    ranges: trials.ranges.filter(({ factor }) => factor !== 'line'),
    phase,
    objective: (levels) => {
      const at = restartLevels(trials, levels);
      return meter(at, searchSoak(trials, at), first.offTime).use;
    },
  });
  const levels = restartLevels(trials, worst.levels);
  const top = trials.ranges.length ? worstAt(levels) : nominal;
  const finding = {
    value: top.energy,
    nominal: nominal.energy,
    corner: cornerOf(trials.ranges, levels),
    phase: source.kind === 'ac' && isSimulated(part.ratings) ? roundedDegrees(phase) : null,
    offTime: top.offTime,
  };
  const start = { worst: top.start, nominal: nominal.start };
  return { check: limiterRestartEnergyCheck({ element: index, finding, start, ratings: part.ratings }, cautionBelow), situation: null };
};

/** Energy of a restart against the rating at the temperature that the body still has, over all times off. */
export const studyRestartEnergy = (trials: Trials): Studied[] =>
  trials.scenario.limiter.flatMap(({ part }, index) => (applies('limiter-restart-energy', part) ? [studyElement(trials, index, part)] : []));
