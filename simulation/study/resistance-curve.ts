import type { ResistanceCurve } from '../../shared/contracts/part';
import type { Level } from '../../shared/model/corner';
import type { Part } from '../../shared/model/part';
import { pathElement } from '../elements/element-of-part';

const POINTS = 120;
/** −55 °C, where the curve begins. */
const COLDEST = 218.15;
/** Where a part states no maximum body temperature: 200 °C, or so far beyond the middle of the rise of a PTC. */
const HOTTEST = 473.15;
const BEYOND_KNEE = 60;

const hottestOf = ({ law, ratings }: Part): number => {
  if (ratings.maximumTemperature !== undefined) return ratings.maximumTemperature;
  return law.law === 'sigmoid' ? law.midpoint + BEYOND_KNEE : HOTTEST;
};

const REFERENCE = 298.15;

/** Zero-power resistance at 25 °C by the part's law, nominal, Ω; a table or Steinhart–Hart coefficients state none. */
export const resistanceAt25 = (part: Part): number => pathElement({ part }, { resistance: 'nominal', b: 'nominal' }).law.resistance(REFERENCE);

const LEVELS: readonly Level[] = ['low', 'nominal', 'high'];

/** R (Ω) against body temperature (K) from −55 °C to the maximum body temperature, with the band of all tolerances. */
export const resistanceCurve = (part: Part): ResistanceCurve => {
  const lawAt = (resistance: Level, b: Level) => pathElement({ part }, { resistance, b }).law;
  const laws = LEVELS.flatMap((resistance) => LEVELS.map((b) => lawAt(resistance, b)));
  const nominal = lawAt('nominal', 'nominal');
  const hottest = hottestOf(part);
  const temperature = Array.from({ length: POINTS }, (_, index) => COLDEST + ((hottest - COLDEST) * index) / (POINTS - 1));
  const over = (pick: (...values: number[]) => number): number[] => temperature.map((at) => pick(...laws.map((law) => law.resistance(at))));
  return {
    temperature,
    nominal: temperature.map((at) => nominal.resistance(at)),
    low: over(Math.min),
    high: over(Math.max),
    valid: { min: nominal.valid.min, max: nominal.valid.max },
  };
};
