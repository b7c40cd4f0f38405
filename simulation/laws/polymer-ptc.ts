import type { ResistanceLaw } from '../circuit/path';

/**
 * Polymer PTC: log10 R = log10 R_lo + (log10 R_hi − log10 R_lo)/(1 + e^(−(T − T_m)/w)); Ω, K.
 * A logistic rise between two resistances; an empirical law of the trade (common practice, no source).
 */
export const polymerPtcLaw = (low: number, high: number, midpoint: number, width: number): ResistanceLaw => {
  const bottom = Math.log(low);
  const span = Math.log(high) - bottom;
  const share = (temperature: number) => 1 / (1 + Math.exp(-(temperature - midpoint) / width));
  const resistance = (temperature: number) => Math.exp(bottom + span * share(temperature));
  return {
    resistance,
    slope: (temperature) => {
      const at = share(temperature);
      return (resistance(temperature) * span * at * (1 - at)) / width;
    },
    temperature: (ohms) => {
      const at = (Math.log(ohms) - bottom) / span;
      return at > 0 && at < 1 ? midpoint + width * Math.log(at / (1 - at)) : null;
    },
    valid: { min: 218.15, max: midpoint + 10 * width },
  };
};
