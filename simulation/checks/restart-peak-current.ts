import type { Check } from '../../shared/model/check';
import { judge, type Finding } from './judge';

/** Highest peak (A) over all times off, from the hottest body, at the highest line, against the user's limit. */
export const restartPeakCurrentCheck = (found: Finding, limit: number | undefined, contactHeld: boolean, cautionBelow: number): Check =>
  judge(
    {
      id: 'restart-peak-current',
      dimension: 'current',
      kind: 'peak',
      sense: 'at-most',
      finding: found,
      rating: limit ?? null,
      basis: 'Soak at the lowest line and full load, restart at the highest line; worst time off, against the limit of this scenario.',
      missing: limit === undefined ? ['the peak current limit of this scenario'] : [],
      notes: contactHeld ? ['At the worst time off the contact has not yet released.'] : [],
    },
    cautionBelow,
  );
