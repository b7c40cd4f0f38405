import type { Check } from '../../shared/model/check';
import { judge, type Finding } from './judge';

/** Steady loss in all limiter elements (W) against the user's limit. Without a limit there is no such check. */
export const limiterLossCheck = (found: Finding, limit: number | undefined, cautionBelow: number): Check[] =>
  limit === undefined
    ? []
    : [
        judge(
          {
            id: 'limiter-loss',
            dimension: 'power',
            sense: 'at-most',
            finding: found,
            rating: limit,
            basis: 'Steady loss in the limiter, contacts included, against the limit of this scenario.',
          },
          cautionBelow,
        ),
      ];
