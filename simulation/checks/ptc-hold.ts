import type { Check } from '../../shared/model/check';
import { judge, type Finding } from './judge';

/** Fold current (A rms) at the highest ambient and resistance against the operating current. */
export const ptcHoldCheck = (element: number, fold: Finding, operating: { worst: number | null; nominal: number | null }, stated: boolean, cautionBelow: number): Check =>
  judge(
    {
      id: 'ptc-hold',
      element,
      dimension: 'current',
      kind: 'rms',
      sense: 'at-least',
      finding: fold,
      rating: operating.worst,
      nominalRating: operating.nominal,
      basis: `Fold current, the largest I with a stable balance I²·R(T) = δ·(T − T_a), against ${stated ? 'the operating current of this scenario' : 'the steady rms current of the path'}.`,
      missing: operating.worst === null ? ['the operating current: none stated, and the run reached no steady state'] : [],
    },
    cautionBelow,
  );
