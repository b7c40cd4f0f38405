import type { Check } from '../../shared/model/check';
import { judge, type Finding } from './judge';

export const NO_COLD_FIGURES =
  'Capacitance and series resistance of the bulk capacitor below 0 °C are not given; their values at 20 °C are used.';

/** Bus voltage (V) reached before the converter starts, against its start voltage. Not reached: it never starts. */
export const coldStartReachCheck = (found: Finding, startVoltage: number, cautions: readonly string[], cautionBelow: number): Check =>
  judge(
    {
      id: 'cold-start-reach',
      dimension: 'voltage',
      sense: 'at-least',
      finding: found,
      rating: startVoltage,
      basis: 'Highest bus voltage with the load still off, lowest line and coldest limiter, against the start voltage.',
      cautions,
      failure: found.value !== null && found.value < startVoltage ? 'The converter never starts: the bus stays below its start voltage.' : null,
    },
    cautionBelow,
  );
