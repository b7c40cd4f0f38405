import type { Check } from '../../shared/model/check';
import { judge, type Finding } from './judge';

/** Drop over the element in operation (V rms) at its highest resistance, against the user's limit. No limit, no check. */
export const ptcVoltageDropCheck = (element: number, found: Finding, limit: number | undefined, cautionBelow: number): Check[] =>
  limit === undefined
    ? []
    : [
        judge(
          {
            id: 'ptc-voltage-drop',
            element,
            dimension: 'voltage',
            kind: 'rms',
            sense: 'at-most',
            finding: found,
            rating: limit,
            basis: 'Operating current times the resistance of the warm body, R_1max scaling the whole curve, against the limit of this scenario.',
          },
          cautionBelow,
        ),
      ];
