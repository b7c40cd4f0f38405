import type { Check } from '../../shared/model/check';
import { judge, type Finding } from './judge';

/** Highest supply voltage (V; AC: V rms), which a tripped PTC takes alone, against V_max: a hard gate. */
export const ptcMaximumVoltageCheck = (element: number, found: Finding, rating: number | undefined, cautionBelow: number): Check =>
  judge(
    {
      id: 'ptc-maximum-voltage',
      element,
      dimension: 'voltage',
      sense: 'at-most',
      finding: found,
      rating: rating ?? null,
      basis: 'Highest supply voltage, all of it over a tripped element, against V_max read as DC or AC rms (common practice).',
      missing: rating === undefined ? ['V_max of the PTC'] : [],
    },
    cautionBelow,
  );
