import type { ResistanceLaw } from '../circuit/path';
import { monotoneCubic } from './monotone-cubic';

/**
 * A maker's R–T table: monotone cubic of ln R against 1/T, both ways. Beyond its ends ln R runs on straight
 * in 1/T, which is the B-value law of the last interval: an extrapolation, flagged through `valid`.
 */
export const tableLaw = (points: readonly { temperature: number; resistance: number }[], scale = 1): ResistanceLaw => {
  const rising = [...points].sort((one, other) => other.temperature - one.temperature);
  const inverse = rising.map(({ temperature }) => 1 / temperature);
  const logs = rising.map(({ resistance }) => Math.log(resistance));
  const law = monotoneCubic(inverse, logs);
  const resistance = (temperature: number) => scale * Math.exp(law.value(1 / temperature));
  return {
    resistance,
    slope: (temperature) => (-law.slope(1 / temperature) * resistance(temperature)) / temperature ** 2,
    temperature: (ohms) => invert(law, inverse, Math.log(ohms / scale)),
    valid: { min: 1 / inverse[inverse.length - 1]!, max: 1 / inverse[0]! },
  };
};

const invert = (law: { value(x: number): number }, inverse: readonly number[], log: number): number | null => {
  let [low, high] = [inverse[0]! / 2, inverse[inverse.length - 1]! * 2];
  if (law.value(low) > log || law.value(high) < log) return null;
  for (let k = 0; k < 80; k += 1) {
    const middle = (low + high) / 2;
    if (law.value(middle) < log) low = middle;
    else high = middle;
  }
  return 2 / (low + high);
};
