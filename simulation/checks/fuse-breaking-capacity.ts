import type { Check } from '../../shared/model/check';
import type { Fuse } from '../../shared/model/protection';
import { judge, type Finding } from './judge';

/** Prospective current at the lowest source impedance and highest line (A rms; DC: A) against the breaking capacity. */
export const fuseBreakingCapacityCheck = (found: Finding, fuse: Fuse, cautionBelow: number): Check =>
  judge(
    {
      id: 'fuse-breaking-capacity',
      dimension: 'current',
      kind: 'rms',
      sense: 'at-most',
      finding: found,
      rating: fuse.breakingCapacity ?? null,
      basis: 'V/|Z| of the source alone, against the breaking capacity of the fuse.',
      missing: [
        ...(fuse.breakingCapacity === undefined ? ['the breaking capacity of the fuse'] : []),
        ...(found.value === null ? ['a source impedance above zero: without one the prospective current has no bound'] : []),
      ],
    },
    cautionBelow,
  );
