import type { Ratings } from '../../shared/model/part';

export type EnergyRating = NonNullable<Ratings['energy']>;

/** What a power-up puts into an element, in each of the quantities that a rating may be stated in. SI. */
export interface PulseEnergy {
  /** Simulated, absorbed by the element, J. */
  absorbed: number | null;
  /** Capacitance behind the element, F. */
  capacitance: number;
  /** Line voltage: V rms, and its crest; equal for DC. */
  voltage: { rms: number; peak: number };
  /** Left on the capacitor at the restart, V. */
  busVoltage: number;
}

/**
 * The energy (J) in the quantity that the rating is stated in: absorbed with absorbed, ½CV² with ½CV² of
 * the same kind of V; of an unknown basis the larger. What a charged capacitor still holds is subtracted.
 */
export const comparedEnergy = (basis: EnergyRating['basis'], pulse: PulseEnergy): number | null => {
  const share = 1 - Math.min(1, (pulse.busVoltage / pulse.voltage.peak) ** 2);
  const stored = (voltage: number): number => 0.5 * pulse.capacitance * voltage ** 2 * share;
  if (basis === 'half-cv2-rms') return stored(pulse.voltage.rms);
  if (basis === 'half-cv2-peak') return stored(pulse.voltage.peak);
  if (basis === 'absorbed' || pulse.absorbed === null) return pulse.absorbed;
  return Math.max(pulse.absorbed, stored(pulse.voltage.peak));
};

/**
 * Energy rating (J) for a body that starts at `start` (K): rating × (T_max − T_start)/(T_max − T_rated),
 * never above the rating. Common practice. Without T_max the rating as it stands.
 */
export const deratedEnergy = (rating: EnergyRating, start: number, maximum: number | undefined): number => {
  if (maximum === undefined || start <= rating.startTemperature || maximum <= rating.startTemperature) return rating.energy;
  return rating.energy * Math.max(0, (maximum - start) / (maximum - rating.startTemperature));
};

export const ENERGY_BASIS: Readonly<Record<EnergyRating['basis'], string>> = {
  absorbed: 'Energy absorbed until the bus is charged, against an absorbed energy',
  'half-cv2-rms': '½·C·V² with V as rms, against a rating stated the same way',
  'half-cv2-peak': '½·C·V² with V as peak, against a rating stated the same way',
  unknown: 'The larger of absorbed energy and ½·C·V², as the basis of the rating is not known',
};

export const UNKNOWN_BASIS = 'The record does not say what the energy rating is the energy of: the larger is used.';
