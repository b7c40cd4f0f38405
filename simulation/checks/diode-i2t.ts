import type { Check } from '../../shared/model/check';
import type { Surge } from './diode-surge';
import { judge, type Finding } from './judge';

/** A²s; derived from the half sine of I_FSM, I²t = I_FSM²·t_p/2, where the record has no figure of its own. */
export const diodeI2tRating = (surge: Surge): number => surge.i2t ?? (surge.current ** 2 * surge.pulseWidth) / 2;

/** I²t of the worst single pulse against that of one diode: a diode conducts every second pulse. */
export const diodeI2tCheck = (found: Finding, surge: Surge | undefined, cautionBelow: number): Check =>
  judge(
    {
      id: 'diode-i2t',
      dimension: 'i2t',
      sense: 'at-most',
      finding: found,
      rating: surge ? diodeI2tRating(surge) : null,
      basis:
        surge?.i2t === undefined
          ? 'I²t of the first pulse against I_FSM²·t_p/2, the I²t of the half sine that I_FSM is stated for.'
          : 'I²t of the first pulse against the I²t rating of one diode.',
      missing: surge ? [] : ['the surge current I_FSM or the I²t of the rectifier'],
    },
    cautionBelow,
  );
