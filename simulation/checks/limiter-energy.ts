import type { Check } from '../../shared/model/check';
import type { Ratings } from '../../shared/model/part';
import { deratedEnergy, ENERGY_BASIS, UNKNOWN_BASIS } from './energy-rating';
import { judge, type Finding } from './judge';

export interface EnergyCase {
  element: number;
  finding: Finding;
  /** Body before the pulse, K. */
  start: { worst: number; nominal: number };
  ratings: Ratings;
}

const pulseNote = (pulses: number | undefined): string[] =>
  pulses === undefined ? ['The record does not say for how many pulses the rating holds.'] : [`The rating holds for ${pulses} pulses.`];

/** Energy of one cold power-up (J), in the quantity of the rating, against the rating at that start temperature. */
export const limiterEnergyCheck = ({ element, finding, start, ratings }: EnergyCase, cautionBelow: number): Check => {
  const { energy: rating, maximumTemperature } = ratings;
  const ratingAt = (temperature: number): number | null => (rating ? deratedEnergy(rating, temperature, maximumTemperature) : null);
  const warm = rating !== undefined && start.worst > rating.startTemperature;
  return judge(
    {
      id: 'limiter-energy',
      element,
      dimension: 'energy',
      sense: 'at-most',
      finding,
      rating: ratingAt(start.worst),
      nominalRating: ratingAt(start.nominal),
      basis: rating
        ? `${ENERGY_BASIS[rating.basis]}; above its start temperature × (T_max − T_start)/(T_max − T_rated) (common practice).`
        : 'Energy of one power-up against the energy rating.',
      missing: rating ? [] : ['the energy rating of the limiter, with what it is the energy of'],
      cautions: [
        ...(rating?.basis === 'unknown' ? [UNKNOWN_BASIS] : []),
        ...(warm && maximumTemperature === undefined ? ['The body starts warmer than the rating supposes, and no maximum temperature is given to derate it by.'] : []),
      ],
      notes: rating ? pulseNote(rating.pulses) : [],
    },
    cautionBelow,
  );
};
