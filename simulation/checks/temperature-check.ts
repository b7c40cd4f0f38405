import type { Check } from '../../shared/model/check';
import type { CheckId } from '../../shared/model/check-id';
import { judge, type Finding } from './judge';

export interface TemperatureCase {
  element: number;
  /** K */
  finding: Finding;
  /** K */
  ambient: { worst: number; nominal: number };
  maximum: number | undefined;
  /** Worst temperature beyond the range that the law was given for. */
  extrapolated: boolean;
}

const HOT_SURFACE = 333.15;

const HOT_NOTE = 'Hot surface: keep people and neighbouring parts away from the body (common practice).';
const EXTRAPOLATED = 'The body leaves the temperature range that its resistance law was given for.';

/** A body temperature (K) against the maximum, both as rise over the ambient of their case. */
export const temperatureCheck = (id: CheckId, words: string, one: TemperatureCase, cautions: string[], cautionBelow: number): Check =>
  judge(
    {
      id,
      element: one.element,
      dimension: 'temperature',
      sense: 'at-most',
      finding: one.finding,
      rating: one.maximum ?? null,
      above: one.ambient,
      basis: `${words}, as rise over ambient against the rise to the maximum body temperature; one thermal node.`,
      missing: one.maximum === undefined ? ['the maximum body temperature of the limiter'] : [],
      cautions: [...cautions, ...(one.extrapolated ? [EXTRAPOLATED] : [])],
      notes: (one.finding.value ?? 0) > HOT_SURFACE ? [HOT_NOTE] : [],
    },
    cautionBelow,
  );
