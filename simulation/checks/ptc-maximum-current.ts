import type { Check } from '../../shared/model/check';
import { judge, type Finding } from './judge';

/** Highest prospective current of the source (A rms; DC: A) against I_max: a hard gate. */
export const ptcMaximumCurrentCheck = (element: number, found: Finding, rating: number | undefined, cautionBelow: number): Check =>
  judge(
    {
      id: 'ptc-maximum-current',
      element,
      dimension: 'current',
      kind: 'rms',
      sense: 'at-most',
      finding: found,
      rating: rating ?? null,
      basis: 'V/|Z| of the source alone at the highest line and lowest impedance, against I_max of the part.',
      missing: [
        ...(rating === undefined ? ['I_max of the PTC'] : []),
        ...(found.value === null ? ['a source impedance above zero: without one the prospective current has no bound'] : []),
      ],
    },
    cautionBelow,
  );
