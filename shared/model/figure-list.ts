import type { Dimension } from '../quantity/dimension';

/** Figures of one run, with what they mean. The JSON carries them under these names, in SI. */
export const FIGURES = {
  peakCurrent: { label: 'Peak current', dimension: 'current' },
  peakCurrentAt: { label: 'Time of the peak', dimension: 'time' },
  pulseWidthHalf: { label: 'Width of the first pulse at half its peak', dimension: 'time' },
  pulseWidthTenth: { label: 'Width of the first pulse at 10 % of its peak', dimension: 'time' },
  firstPulseI2t: { label: 'I²t of the first pulse', dimension: 'i2t' },
  firstPulseEnergy: { label: 'Energy in the limiter, first pulse', dimension: 'energy' },
  chargeI2t: { label: 'I²t to the end of charging', dimension: 'i2t' },
  chargeEnergy: { label: 'Energy in the limiter to the end of charging', dimension: 'energy' },
  chargedAt: { label: 'End of charging', dimension: 'time' },
  totalI2t: { label: 'I²t of the whole run', dimension: 'i2t' },
  sourceEnergy: { label: 'Energy from the source', dimension: 'energy' },
  steadyRmsCurrent: { label: 'Steady line current, rms', dimension: 'current' },
  steadyPeakCurrent: { label: 'Steady line current, peak', dimension: 'current' },
  highestHalfPeriodRms: { label: 'Highest half-period rms current', dimension: 'current' },
  limiterLoss: { label: 'Steady loss in the limiter', dimension: 'power' },
  limiterLossShare: { label: 'Limiter loss, share of input', dimension: 'ratio' },
  highestBus: { label: 'Highest bus voltage', dimension: 'voltage' },
  finalBusLow: { label: 'Lowest bus voltage, last cycle', dimension: 'voltage' },
  busAtLoadStart: { label: 'Bus voltage at load start', dimension: 'voltage' },
  lowestBusUnderLoad: { label: 'Lowest bus after load start', dimension: 'voltage' },
  loadStarts: { label: 'Number of load starts', dimension: 'count' },
  loadStartAt: { label: 'First load start', dimension: 'time' },
  bypassClosedAt: { label: 'Contact closes', dimension: 'time' },
  bypassSecondPeak: { label: 'Second peak after the contact closes', dimension: 'current' },
  bypassVoltage: { label: 'Voltage over the contact before it closes', dimension: 'voltage' },
  timeToTrip: { label: 'Time to trip', dimension: 'time' },
  letThroughI2t: { label: 'Let-through I²t', dimension: 'i2t' },
  letThroughEnergy: { label: 'Let-through energy in the element', dimension: 'energy' },
  trippedCurrent: { label: 'Current when tripped, rms', dimension: 'current' },
  trippedPower: { label: 'Power when tripped', dimension: 'power' },
  timeToDischarge: { label: 'Time from switch-off until the bus is below 60 V', dimension: 'time' },
} as const satisfies Record<string, { label: string; dimension: Dimension }>;

export type FigureId = keyof typeof FIGURES;
/** Null where the run has no such figure (no contact, never charged). */
export type Figures = Record<FigureId, number | null>;
