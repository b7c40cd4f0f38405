import type { Check } from '../../shared/model/check';
import { judge, type Finding } from './judge';

export interface TripCase {
  element: number;
  /** s from the fault to the trip; null where it never trips. */
  finding: Finding;
  allowed: number | undefined;
  faultStated: boolean;
  /** The run followed the fault to its end and the element did not trip. */
  neverTrips: boolean;
}

/** Slowest time to trip (s) on the stated fault against the time allowed. */
export const ptcTimeToTripCheck = ({ element, finding, allowed, faultStated, neverTrips }: TripCase, cautionBelow: number): Check =>
  judge(
    {
      id: 'ptc-time-to-trip',
      element,
      dimension: 'time',
      sense: 'at-most',
      finding,
      rating: allowed ?? null,
      basis: 'From the fault until the current is below half of what it was (step fault), lowest ambient and resistance.',
      missing: [
        ...(faultStated ? [] : ['the fault that must trip it']),
        ...(allowed === undefined ? ['the time allowed for the trip'] : []),
      ],
      failure: faultStated && neverTrips ? 'The element does not trip on this fault within the run.' : null,
      notes: ['A PTC limits; it does not replace an interrupting device.'],
    },
    cautionBelow,
  );
