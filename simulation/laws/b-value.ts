import type { ResistanceLaw } from '../circuit/path';

/** K; 25 °C, at which R25 is stated. */
const REFERENCE = 298.15;

/**
 * NTC by B-value: R = R25·exp(B·(1/T − 1/298.15 K)); Ω, K.
 * Source: IEC 60539-1 (from memory). Beyond −55 °C to 250 °C the law is an extrapolation (common practice).
 */
export const bValueLaw = (r25: number, b: number): ResistanceLaw => {
  const resistance = (temperature: number) => r25 * Math.exp(b * (1 / temperature - 1 / REFERENCE));
  return {
    resistance,
    slope: (temperature) => (-b / temperature ** 2) * resistance(temperature),
    temperature: (ohms) => {
      const inverse = 1 / REFERENCE + Math.log(ohms / r25) / b;
      return inverse > 0 ? 1 / inverse : null;
    },
    valid: { min: 218.15, max: 523.15 },
  };
};

/** B (K) through two points of an NTC: B = ln(R1/R2)/(1/T1 − 1/T2). Source: IEC 60539-1 (from memory). */
export const bFromTwoPoints = (t1: number, r1: number, t2: number, r2: number): number => Math.log(r1 / r2) / (1 / t1 - 1 / t2);
