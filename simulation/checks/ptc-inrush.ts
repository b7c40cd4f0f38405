import type { Check } from '../../shared/model/check';
import { judge, type Finding } from './judge';

export interface InrushCase {
  element: number;
  /** Highest body temperature until the bus is charged, from cold and from the steady body, K. */
  finding: Finding;
  /** Body temperature at which R is ten times its value at the start, K. */
  tripTemperature: { worst: number | null; nominal: number | null };
  ambient: { worst: number; nominal: number };
}

/** The inrush must not trip the element: its resistance stays below ten times that at the start. */
export const ptcInrushCheck = ({ element, finding, tripTemperature, ambient }: InrushCase, cautionBelow: number): Check =>
  judge(
    {
      id: 'ptc-inrush',
      element,
      dimension: 'temperature',
      sense: 'at-most',
      finding,
      rating: tripTemperature.worst,
      nominalRating: tripTemperature.nominal,
      above: ambient,
      basis: 'Body temperature while charging, from cold and from the steady body, against that of 10 × the resistance at the start; by rise.',
      missing: tripTemperature.worst === null ? ['a resistance law that reaches ten times its value at the start'] : [],
    },
    cautionBelow,
  );
