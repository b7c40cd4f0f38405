import type { DraftNode } from '@/hooks/scenario/draft-tree';
import type { Source } from '@/shared/model/source';

const DIGITS = 6;
const rounded = (value: number) => Number(value.toPrecision(DIGITS));

/**
 * The same impedance told the other way: prospective current `I = V/√(R² + X²)` and X/R, or R and L from these.
 * The nominal values are carried over; bands are the person's to give again.
 * Where the other way has no number (no resistance at all), the field is left empty to be filled.
 */
export const convertedImpedance = (source: Source): DraftNode => {
  const { impedance, voltage } = source;
  const omega = source.kind === 'ac' ? 2 * Math.PI * (source.frequencies[0] ?? 50) : 0;
  if ('resistance' in impedance) {
    const [resistance, reactance] = [impedance.resistance.nominal, omega * impedance.inductance.nominal];
    const magnitude = Math.hypot(resistance, reactance);
    const current = magnitude > 0 ? rounded(voltage.nominal / magnitude) : '';
    return { prospectiveCurrent: { nominal: current, tolerance: 0 }, reactanceRatio: resistance > 0 ? rounded(reactance / resistance) : '' };
  }
  const magnitude = voltage.nominal / impedance.prospectiveCurrent.nominal;
  const ratio = omega > 0 ? impedance.reactanceRatio : 0;
  const resistance = magnitude / Math.hypot(1, ratio);
  const inductance = omega > 0 ? (resistance * ratio) / omega : 0;
  return { resistance: { nominal: rounded(resistance), tolerance: 0 }, inductance: { nominal: rounded(inductance), tolerance: 0 } };
};
