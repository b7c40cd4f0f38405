import type { Level } from '../../shared/model/corner';
import type { Toleranced } from '../../shared/model/quantity';
import type { Source } from '../../shared/model/source';

export interface LoopImpedance {
  /** Ω */
  resistance: number;
  /** H */
  inductance: number;
}

const at = (band: Toleranced, level: Level): number => ({ low: band.min, nominal: band.nominal, high: band.max })[level];
const OPPOSITE = { low: 'high', nominal: 'nominal', high: 'low' } as const satisfies Record<Level, Level>;

/**
 * Source resistance (Ω) and inductance (H) at a level: `low` is the lowest impedance, hence the highest
 * prospective current. |Z| = V/I_p, R = |Z|/√(1 + (X/R)²), L = X/(2πf); V is the nominal voltage, at which
 * a prospective current is stated. A DC source has no reactance at 0 Hz, so R = V/I_p and X/R is read as
 * the ratio at 50 Hz.
 */
export const impedanceAt = (source: Source, level: Level, frequency: number): LoopImpedance => {
  const { impedance } = source;
  if ('resistance' in impedance) return { resistance: at(impedance.resistance, level), inductance: at(impedance.inductance, level) };
  const magnitude = source.voltage.nominal / at(impedance.prospectiveCurrent, OPPOSITE[level]);
  if (source.kind === 'dc') return { resistance: magnitude, inductance: (magnitude * impedance.reactanceRatio) / (2 * Math.PI * 50) };
  const resistance = magnitude / Math.hypot(1, impedance.reactanceRatio);
  return { resistance, inductance: (resistance * impedance.reactanceRatio) / (2 * Math.PI * frequency) };
};

/** |Z| in Ω at a frequency; at 0 Hz the resistance. */
export const magnitudeOf = ({ resistance, inductance }: LoopImpedance, frequency: number): number =>
  Math.hypot(resistance, 2 * Math.PI * frequency * inductance);

/**
 * Prospective short-circuit current (A rms; DC: A) at a line voltage, V/|Z| in the steady state. A source
 * without any impedance has none that is finite: null.
 */
export const prospectiveCurrent = (source: Source, level: Level, voltage: number, frequency: number): number | null => {
  const magnitude = magnitudeOf(impedanceAt(source, level, frequency), source.kind === 'dc' ? 0 : frequency);
  return magnitude > 0 ? voltage / magnitude : null;
};
