import type { Check } from '../../shared/model/check';
import { judge, type Finding } from './judge';

export interface SecondPeakCase {
  element: number;
  finding: Finding;
  makingCurrent: number | undefined;
  limit: number | undefined;
  /** Over the contact just before it closes, at the worst instant, V. */
  contactVoltage: number | null;
}

const voltageNote = (voltage: number | null): string[] =>
  voltage === null ? [] : [`Up to ${voltage.toPrecision(3)} V stand over the contact before it closes.`];

/**
 * Peak current (A) after the contact closes, at the worst instant of the half cycle, against its making
 * current and the user's limit, whichever is lower.
 */
export const bypassSecondPeakCheck = (one: SecondPeakCase, cautionBelow: number): Check => {
  const ratings = [one.makingCurrent, one.limit].filter((rating) => rating !== undefined);
  const rating = ratings.length ? Math.min(...ratings) : null;
  return judge(
    {
      id: 'bypass-second-peak',
      element: one.element,
      dimension: 'current',
      kind: 'peak',
      sense: 'at-most',
      finding: one.finding,
      rating,
      basis: `Peak after closing at the worst instant of the half cycle, against the ${rating !== null && rating === one.makingCurrent ? 'making current of the contact' : 'peak current limit of this scenario'}.`,
      missing: one.makingCurrent === undefined ? ['the making current of the contact'] : [],
      notes: voltageNote(one.contactVoltage),
    },
    cautionBelow,
  );
};
