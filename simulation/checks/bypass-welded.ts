import type { Check } from '../../shared/model/check';
import { surgeRating, type Surge } from './diode-surge';
import { judge, type Finding } from './judge';

export interface WeldedCase {
  element: number;
  finding: Finding;
  surge: Surge | undefined;
  /** Of the first pulse at 10 % of its peak, s. */
  width: { worst: number | null; nominal: number | null };
  /** What stands for a rating where the path has no rectifier, A. */
  limit: number | undefined;
  hasRectifier: boolean;
}

const beyondLimit = ({ finding, limit }: WeldedCase): string[] =>
  limit !== undefined && finding.value !== null && finding.value > limit
    ? [`Beyond the peak limit of ${limit} A at every start until the contact is replaced.`]
    : [];

/**
 * Cold peak (A) with the contact closed from the start. A single fault, so it is held against what breaks,
 * the surge current of the rectifier; without a rectifier against the user's limit.
 */
export const bypassWeldedCheck = (one: WeldedCase, cautionBelow: number): Check => {
  const { surge, hasRectifier } = one;
  const ratingAt = (width: number | null): number | null => {
    if (!hasRectifier) return one.limit ?? null;
    return surge && width !== null ? surgeRating(surge, width) : null;
  };
  const needed = hasRectifier ? 'the surge current I_FSM of the rectifier' : 'the peak current limit of this scenario';
  return judge(
    {
      id: 'bypass-welded',
      element: one.element,
      dimension: 'current',
      kind: 'peak',
      sense: 'at-most',
      finding: one.finding,
      rating: ratingAt(one.width.worst),
      nominalRating: ratingAt(one.width.nominal),
      basis: hasRectifier
        ? 'Peak from cold with the contact welded, against I_FSM rescaled to the width of the pulse (common practice).'
        : 'Peak from cold with the contact welded, against the limit of this scenario.',
      missing: (hasRectifier ? surge : one.limit) === undefined ? [needed] : [],
      notes: hasRectifier ? beyondLimit(one) : [],
    },
    cautionBelow,
  );
};
