import type { Check } from '../../shared/model/check';
import { judge, type Finding } from './judge';

/** Highest line current of a cold start (A peak) against the user's limit. */
export const peakCurrentCheck = (found: Finding, limit: number | undefined, cautionBelow: number): Check =>
  judge(
    {
      id: 'peak-current',
      dimension: 'current',
      kind: 'peak',
      sense: 'at-most',
      finding: found,
      rating: limit ?? null,
      basis: 'Highest instantaneous line current from cold, against the limit of this scenario.',
      missing: limit === undefined ? ['the peak current limit of this scenario'] : [],
    },
    cautionBelow,
  );
