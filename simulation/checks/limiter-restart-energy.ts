import type { Check } from '../../shared/model/check';
import { deratedEnergy, ENERGY_BASIS, UNKNOWN_BASIS } from './energy-rating';
import { judge } from './judge';
import type { EnergyCase } from './limiter-energy';

/** Energy of a restart (J) against the rating × (T_max − T_start)/(T_max − 25 °C), T_start after the time off. */
export const limiterRestartEnergyCheck = ({ element, finding, start, ratings }: EnergyCase, cautionBelow: number): Check => {
  const { energy: rating, maximumTemperature } = ratings;
  const ratingAt = (temperature: number): number | null =>
    rating && maximumTemperature !== undefined ? deratedEnergy(rating, temperature, maximumTemperature) : null;
  return judge(
    {
      id: 'limiter-restart-energy',
      element,
      dimension: 'energy',
      sense: 'at-most',
      finding,
      rating: ratingAt(start.worst),
      nominalRating: ratingAt(start.nominal),
      basis: `${rating ? ENERGY_BASIS[rating.basis] : 'Energy of a restart'}; rating × (T_max − T_start)/(T_max − T_rated), T_rated 25 °C unless stated (common practice).`,
      missing: [
        ...(rating ? [] : ['the energy rating of the limiter']),
        ...(maximumTemperature === undefined ? ['the maximum body temperature of the limiter'] : []),
      ],
      cautions: rating?.basis === 'unknown' ? [UNKNOWN_BASIS] : [],
    },
    cautionBelow,
  );
};
