import type { Check } from '../../shared/model/check';
import type { Rectifier } from '../../shared/model/rectifier';
import { judge, type Finding } from './judge';

export type Surge = NonNullable<Extract<Rectifier, { kind: 'bridge' }>['surge']>;

const SHORTEST = 1e-3;

/**
 * Surge current (A peak) that a diode stands for a pulse `width` (s) wide, from its I_FSM at the width it is
 * stated for: constant I²t, I = I_FSM·√(t_ref/t), down to 1 ms and held below. Common practice.
 */
export const surgeRating = (surge: Pick<Surge, 'current' | 'pulseWidth'>, width: number): number =>
  surge.current * Math.sqrt(surge.pulseWidth / Math.max(width, Math.min(SHORTEST, surge.pulseWidth)));

/** Peak current of the first pulse against I_FSM rescaled to the pulse's width at 10 % of its peak. */
export const diodeSurgeCheck = (
  found: Finding,
  surge: Surge | undefined,
  width: { worst: number | null; nominal: number | null },
  cautionBelow: number,
): Check => {
  const ratingAt = (one: number | null): number | null => (surge && one !== null ? surgeRating(surge, one) : null);
  return judge(
    {
      id: 'diode-surge',
      dimension: 'current',
      kind: 'peak',
      sense: 'at-most',
      finding: found,
      rating: ratingAt(width.worst),
      nominalRating: ratingAt(width.nominal),
      basis: 'I_FSM rescaled to the width of the pulse at constant I²t from 10 ms down to 1 ms, held below (common practice).',
      missing: surge ? [] : ['the surge current I_FSM of the rectifier, with its pulse width'],
    },
    cautionBelow,
  );
};
