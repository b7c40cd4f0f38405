import type { Assessment } from '@/shared/model/result';
import type { Scenario } from '@/shared/model/scenario';

/** Volts up to which a charged bus is taken as touchable in the caution: common practice, 60 V DC. */
export const STORED_FROM = 60;

export interface StoredCharge {
  /** Highest voltage of the bus, V. */
  voltage: number;
  /** From switch-off until the bus is below 60 V, s; null without a bleeder: nothing is sure to empty it. */
  dischargesIn: number | null;
}

/** The charge that stays after switch-off, where it is worth a caution. */
export const storedCharge = ({ bulk }: Scenario, assessment: Assessment | null): StoredCharge | null => {
  const { highestBus, timeToDischarge } = assessment?.run.figures ?? { highestBus: null, timeToDischarge: null };
  const voltage = highestBus ?? 0;
  if (voltage <= STORED_FROM) return null;
  return { voltage, dischargesIn: bulk.bleeder === undefined ? null : timeToDischarge };
};
