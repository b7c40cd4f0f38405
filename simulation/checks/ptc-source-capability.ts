import type { Check } from '../../shared/model/check';
import { judge, type Finding } from './judge';

/** Fault current that the source can deliver (A rms) against the fold current at the lowest ambient and resistance. */
export const ptcSourceCapabilityCheck = (
  element: number,
  faultCurrent: Finding,
  fold: { worst: number; nominal: number },
  faultStated: boolean,
  cautionBelow: number,
): Check =>
  judge(
    {
      id: 'ptc-source-capability',
      element,
      dimension: 'current',
      kind: 'rms',
      sense: 'at-least',
      finding: faultCurrent,
      rating: fold.worst,
      nominalRating: fold.nominal,
      basis: `V/|Z| at the lowest line and highest source impedance, ${faultStated ? 'into the stated fault' : 'into a dead short'}, against the fold current: no smaller current trips.`,
      notes: faultStated ? [] : ['No fault is stated: a dead short is assumed, which is the easiest case.'],
      cautions: faultStated ? [] : ['The smallest fault that must trip is not stated.'],
    },
    cautionBelow,
  );
