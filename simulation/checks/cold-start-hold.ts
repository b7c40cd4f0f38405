import type { Check } from '../../shared/model/check';
import { judge, type Finding } from './judge';

export interface HoldCase {
  /** Lowest bus voltage after the load start, V. */
  finding: Finding;
  stopVoltage: number;
  /** Load starts in the worst run; more than one is a hiccup. */
  starts: number;
}

const failureOf = (starts: number): string | null => {
  if (starts === 0) return 'The converter never starts: no bus under load to hold.';
  return starts > 1 ? `Hiccup: the load pulls the bus below its stop voltage and starts ${starts} times.` : null;
};

/** Lowest bus voltage after the load start (V) against the stop voltage of the converter. */
export const coldStartHoldCheck = ({ finding, stopVoltage, starts }: HoldCase, cautions: readonly string[], cautionBelow: number): Check =>
  judge(
    {
      id: 'cold-start-hold',
      dimension: 'voltage',
      sense: 'at-least',
      finding,
      rating: stopVoltage,
      basis: 'Lowest bus voltage after the load starts, lowest line and coldest limiter, against the stop voltage.',
      cautions,
      failure: failureOf(starts),
    },
    cautionBelow,
  );
