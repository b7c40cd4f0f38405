import type { Check } from '../../shared/model/check';
import { judge, type Finding } from './judge';

/**
 * Latest closing of the contact (s) against the load start (s). A contact that closes later breaks no rating by
 * itself (its second peak, the lowest bus and the body are held against theirs), so this is a caution at worst.
 */
export const bypassLoadCoincidenceCheck = (
  element: number,
  closing: Finding,
  loadStart: { worst: number | null; nominal: number | null },
  cautionBelow: number,
): Check => {
  const check = judge(
    {
      id: 'bypass-load-coincidence',
      element,
      dimension: 'time',
      sense: 'at-most',
      finding: closing,
      rating: loadStart.worst,
      nominalRating: loadStart.nominal,
      basis: 'Closing of the contact against the first load start (common practice): a sequence, not a rating.',
      missing: loadStart.worst === null ? ['a load start: the converter never starts in this run'] : [],
    },
    cautionBelow,
  );
  if (check.status !== 'fail') return check;
  return {
    ...check,
    status: 'caution',
    remark: 'The load starts before the contact closes: its current passes through the limiter and adds to the second peak.',
  };
};
