import { deratedEnergy } from '../../simulation/checks/energy-rating';
import type { CheckId } from '../../shared/model/check-id';
import type { Scenario } from '../../shared/model/scenario';
import { assess } from '../../simulation';
import { moved, type Levels } from '../../simulation/study/levels';
import { ambientAt } from '../../simulation/study/resolve-path';
import { trialsOf, type Trials } from '../../simulation/study/trials';
import { bypassScenario, limiterWith, mainsScenario, railScenario } from '../support/study-scenarios';

/*
 * The fast search (one flip of each factor, the vertex by the signs, its neighbours) against every vertex of the
 * full factorial set and a fine scan of the switch-on angle. Nothing from outside: the two must agree.
 */
const everyVertex = (trials: Trials): Levels[] =>
  trials.ranges.reduce<Levels[]>(
    (list, { factor, levels }) => list.flatMap((one) => levels.filter((level) => level !== 'nominal').map((level) => moved(one, factor, level))),
    [{}],
  );

type Measure = (trials: Trials, levels: Levels, phase: number) => number;

const highestOfAll = (scenario: Scenario, measure: Measure, phases: number): number => {
  const trials = trialsOf(scenario);
  const angles = Array.from({ length: phases }, (_, index) => (index * Math.PI) / phases);
  return Math.max(...everyVertex(trials).flatMap((levels) => angles.map((phase) => measure(trials, levels, phase))));
};

const ratioOf = (scenario: Scenario, id: CheckId): number | null | undefined =>
  assess(scenario, { envelope: false }).checks.find((check) => check.id === id)?.ratio;

const peak: Measure = (trials, levels, phase) => trials.firstPulse({ levels, phase }).figures.peakCurrent! / trials.scenario.limits.peakCurrent!;
const i2t: Measure = (trials, levels, phase) => trials.firstPulse({ levels, phase }).figures.firstPulseI2t! / 180;
const energy: Measure = (trials, levels, phase) => {
  const { ratings } = trials.scenario.limiter[0]!.part;
  return trials.charge({ levels, phase }).elements[0]!.chargeEnergy! / deratedEnergy(ratings.energy!, ambientAt(trials.scenario, levels), ratings.maximumTemperature);
};
const steadyRise: Measure = (trials, levels, phase) => {
  const ambient = ambientAt(trials.scenario, levels);
  const { finalTemperature } = trials.whole({ levels, phase }).run.elements[0]!;
  return (finalTemperature - ambient) / (trials.scenario.limiter[0]!.part.ratings.maximumTemperature! - ambient);
};
const lowestBus: Measure = (trials, levels, phase) => 140 / trials.whole({ levels, phase }).run.figures.lowestBusUnderLoad!;

const wide = mainsScenario();
const table = mainsScenario({
  limiter: limiterWith({ law: { law: 'b-value', r25: '5 ±25 %', b: '3.4k ±5 %' } }),
  source: { kind: 'ac', voltage: { nominal: 120, min: 90, max: 132 }, frequencies: [50, 60], impedance: { prospectiveCurrent: { nominal: 500, min: 200, max: 2000 }, reactanceRatio: 0.4 } },
  load: { kind: 'resistance', resistance: 300 },
});

describe('the worst corner found by flips is that of the full factorial set', () => {
  it.each<[string, Scenario, CheckId, Measure, number]>([
    ['peak current, 230 V', wide, 'peak-current', peak, 15],
    ['peak current, 90–132 V, both frequencies, supply by prospective current', table, 'peak-current', peak, 15],
    ['I²t of the first pulse, 230 V', wide, 'diode-i2t', i2t, 15],
    ['energy to the end of charging, 230 V', wide, 'limiter-energy', energy, 8],
    ['steady temperature, 230 V', wide, 'limiter-steady-temperature', steadyRise, 1],
    ['lowest bus after the load start, 230 V', wide, 'cold-start-hold', lowestBus, 1],
  ])('%s', (_, scenario, id, measure, phases) => {
    const full = highestOfAll(scenario, measure, phases);
    expect(ratioOf(scenario, id)! / full).toBeGreaterThan(0.998);
    expect(ratioOf(scenario, id)! / full).toBeLessThan(1.01);
  });

  it('time to trip, 24 V', () => {
    const scenario = railScenario();
    const full = highestOfAll(
      scenario,
      (trials, levels) => {
        const path = { levels, phase: 0 };
        return trials.whole(path, { name: 'fault', change: (one) => one }).run.elements[0]!.trippedAt! - 1;
      },
      1,
    );
    expect(assess(scenario, { envelope: false }).checks.find(({ id }) => id === 'ptc-time-to-trip')!.value! / full).toBeCloseTo(1, 2);
  });
});

describe('the worst switch-on angle', () => {
  it('differs from check to check, and I²t is not highest from the crest', () => {
    const { checks } = assess(bypassScenario(), { envelope: false });
    const phaseOf = (id: CheckId): number => checks.find((check) => check.id === id)!.phase!;
    expect(phaseOf('peak-current')).toBeGreaterThan(phaseOf('diode-i2t') + 5);
  });
});
