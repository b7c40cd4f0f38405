import type { PathElement, PowerPath, ResistanceLaw } from '../../simulation/circuit/path';
import { fixedLaw } from '../../simulation/laws/fixed';

/** A limiter element for a test; heavy and without loss unless told otherwise. */
export const element = (law: ResistanceLaw, more: Partial<PathElement> = {}): PathElement => ({
  name: 'test element', kind: 'resistor', law, dissipation: 1e-9, heatCapacity: 1e6, bypass: null, ...more,
});

export const resistor = (ohms: number, more: Partial<PathElement> = {}) => element(fixedLaw(ohms), more);

/** A DC step into a capacitor through the elements alone, 25 °C. */
export const directPath = (voltage: number, capacitance: number, elements: readonly PathElement[], more: Partial<PowerPath> = {}): PowerPath => ({
  source: { kind: 'dc', amplitude: voltage, frequency: 0, phase: 0, resistance: 0, inductance: 0, programme: [] },
  elements,
  rectifier: { kind: 'none' },
  bulk: { capacitance, esr: 0, initialVoltage: 0, bleeder: null },
  load: { kind: 'none' },
  fault: null,
  ambient: 298.15,
  ...more,
});

/** Mains through a bridge without losses of its own. */
export const mainsPath = (amplitude: number, phase: number, capacitance: number, elements: readonly PathElement[], more: Partial<PowerPath> = {}): PowerPath => ({
  ...directPath(amplitude, capacitance, elements),
  source: { kind: 'ac', amplitude, frequency: 50, phase, resistance: 0, inductance: 0, programme: [] },
  rectifier: { kind: 'bridge', forwardVoltage: 0, slopeResistance: 0 },
  ...more,
});
