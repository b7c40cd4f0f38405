import type { Part } from '../../shared/model/part';
import type { CheckId } from '../../shared/model/check-id';

/**
 * Whether a rating of a part makes a check. A limiter of NTC or resistor must be rated for energy, temperature and
 * steady current, so an absent figure is "not assessed". A polymer PTC is rated by hold, trip, I_max and V_max; these
 * figures count where its record has them. A capacitance rating says in another way what an energy rating says:
 * it is asked for only where both are absent. While charging, the inrush check of a PTC holds its body against the
 * temperature of a trip, which is lower than any maximum.
 */
export const applies = (id: CheckId, { kind, ratings }: Part): boolean => {
  if (id === 'limiter-capacitance') return ratings.capacitance !== undefined || (kind === 'ntc' && ratings.energy === undefined);
  if (kind !== 'polymer-ptc') return true;
  if (id === 'limiter-energy' || id === 'limiter-restart-energy') return ratings.energy !== undefined;
  if (id === 'limiter-steady-current') return ratings.steadyCurrent !== undefined;
  if (id === 'limiter-peak-temperature' && ratings.energy === undefined) return false;
  return ratings.maximumTemperature !== undefined;
};
