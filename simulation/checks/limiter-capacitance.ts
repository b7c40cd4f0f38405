import type { Check } from '../../shared/model/check';
import type { Ratings } from '../../shared/model/part';
import { judge, type Finding } from './judge';

export type CapacitanceRating = NonNullable<Ratings['capacitance']>;

/** The capacitance rating as the C (F) that it allows at another voltage of the same kind: C_rated·V_rated²/V². */
export const allowedCapacitance = (rating: CapacitanceRating, voltage: { rms: number; peak: number }): number =>
  rating.capacitance * (rating.voltage / voltage[rating.voltageIs]) ** 2;

/** Bulk capacitance (F) against the capacitance rating at this line voltage: C·V² ≤ C_rated·V_rated². */
export const limiterCapacitanceCheck = (
  element: number,
  found: Finding,
  rating: CapacitanceRating | undefined,
  voltage: { worst: { rms: number; peak: number }; nominal: { rms: number; peak: number } },
  cautionBelow: number,
): Check =>
  judge(
    {
      id: 'limiter-capacitance',
      element,
      dimension: 'capacitance',
      sense: 'at-most',
      finding: found,
      rating: rating ? allowedCapacitance(rating, voltage.worst) : null,
      nominalRating: rating ? allowedCapacitance(rating, voltage.nominal) : null,
      basis: 'C·V² ≤ C_rated·V_rated² with V of the same kind, IEC 60539-1 (from memory); screening.',
      missing: rating ? [] : ['the capacitance rating of the limiter, with its voltage'],
    },
    cautionBelow,
  );
