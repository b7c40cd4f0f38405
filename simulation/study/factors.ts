import type { Corner, Factor, Level } from '../../shared/model/corner';
import type { Toleranced } from '../../shared/model/quantity';
import type { Part } from '../../shared/model/part';
import type { Scenario } from '../../shared/model/scenario';
import { levelOf, type Levels } from './levels';
import { impedanceAt, magnitudeOf } from './source-impedance';

/** A factor of the scenario that has a range. */
export interface FactorRange {
  factor: Factor;
  /** SI; what the factor comes to at each level. */
  values: Readonly<Record<Level, number>>;
  /** The levels that differ from each other, nominal first. */
  levels: readonly Level[];
}

const rangeOf = (factor: Factor, values: Record<Level, number>): FactorRange[] => {
  const levels: Level[] = ['nominal'];
  if (values.low !== values.nominal) levels.push('low');
  if (values.high !== values.nominal) levels.push('high');
  return levels.length > 1 ? [{ factor, values, levels }] : [];
};

const ofBand = (factor: Factor, { min, nominal, max }: Toleranced): FactorRange[] =>
  rangeOf(factor, { low: min, nominal, high: max });

const frequencyRange = ({ source }: Scenario): FactorRange[] => {
  if (source.kind === 'dc') return [];
  const [nominal = 50] = source.frequencies;
  return rangeOf('frequency', { low: Math.min(...source.frequencies), nominal, high: Math.max(...source.frequencies) });
};

/** Ω; where the law has no resistance of its own the share is given about 1. */
const resistanceBand = (part: Part): Toleranced => {
  const { law } = part;
  if (law.law === 'b-value') return law.r25;
  if (law.law === 'sigmoid') return law.low;
  if (law.law === 'fixed') return law.resistance;
  return { nominal: 1, min: 1 - law.tolerance, max: 1 + law.tolerance };
};

/** The first element that has a range speaks for all: a factor moves them alike. */
const elementRange = (scenario: Scenario, factor: Factor, bandOf: (part: Part) => Toleranced | null): FactorRange[] =>
  scenario.limiter
    .flatMap(({ part }) => {
      const band = bandOf(part);
      return band ? ofBand(factor, band) : [];
    })
    .slice(0, 1);

/** |Z| in Ω at the nominal frequency; of a DC source the resistance, or |Z| at 50 Hz where only L has a range. */
const impedanceRange = ({ source }: Scenario): FactorRange[] => {
  const rangeAt = (frequency: number): FactorRange[] => {
    const at = (level: Level) => magnitudeOf(impedanceAt(source, level, frequency || 50), frequency);
    return rangeOf('sourceImpedance', { low: at('low'), nominal: at('nominal'), high: at('high') });
  };
  if (source.kind === 'ac') return rangeAt(source.frequencies[0] ?? 50);
  const byResistance = rangeAt(0);
  return byResistance.length > 0 ? byResistance : rangeAt(50);
};

/** Every factor of the scenario that has a range, in the order of the contract. */
export const rangingFactors = (scenario: Scenario): FactorRange[] => [
  ...ofBand('line', scenario.source.voltage),
  ...frequencyRange(scenario),
  ...ofBand('ambient', scenario.ambient),
  ...elementRange(scenario, 'elementResistance', resistanceBand),
  ...elementRange(scenario, 'elementB', ({ law }) => (law.law === 'b-value' ? law.b : null)),
  ...ofBand('capacitance', scenario.bulk.capacitance),
  ...ofBand('esr', scenario.bulk.esr),
  ...impedanceRange(scenario),
];

/** Kelvin have no share off nominal that means anything. */
const changeOf = ({ factor, values }: FactorRange, level: Level): number | null =>
  factor === 'ambient' || values.nominal === 0 ? null : values[level] / values.nominal - 1;

/** The corner as reported: only the factors that have a range. */
export const cornerOf = (ranges: readonly FactorRange[], levels: Levels): Corner => ({
  factors: ranges.map((range) => {
    const level = levelOf(levels, range.factor);
    return { factor: range.factor, level, value: range.values[level], change: changeOf(range, level) };
  }),
});
