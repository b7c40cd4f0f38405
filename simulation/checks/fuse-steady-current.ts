import type { Check } from '../../shared/model/check';
import type { Fuse } from '../../shared/model/protection';
import { judge, type Finding } from './judge';

/** Steady line current (A rms; DC: A) against the fuse's rating derated at the highest ambient. */
export const fuseSteadyCurrentCheck = (found: Finding, fuse: Fuse, cautionBelow: number): Check =>
  judge(
    {
      id: 'fuse-steady-current',
      dimension: 'current',
      kind: 'rms',
      sense: 'at-most',
      finding: found,
      rating: fuse.deratedCurrent ?? fuse.ratedCurrent,
      basis:
        fuse.deratedCurrent === undefined
          ? 'Steady current against the rated current of the fuse, not derated.'
          : 'Steady current against the rating of the fuse, derated at the highest ambient.',
      cautions: fuse.deratedCurrent === undefined ? ['No rating at the highest ambient is given: the rated current is used as it stands.'] : [],
    },
    cautionBelow,
  );
