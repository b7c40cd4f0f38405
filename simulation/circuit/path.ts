/**
 * One power-up path with every range resolved to one value: what a single run integrates. SI throughout.
 */
export interface PowerPath {
  source: PathSource;
  elements: readonly PathElement[];
  rectifier: { kind: 'bridge'; forwardVoltage: number; slopeResistance: number } | { kind: 'none' };
  bulk: { capacitance: number; esr: number; initialVoltage: number; bleeder: number | null };
  load: PathLoad;
  fault: { at: number; resistance: number } | null;
  /** K */
  ambient: number;
}

export interface PathSource {
  kind: 'ac' | 'dc';
  /** Crest of the sine (√2·V_rms), or the DC voltage. */
  amplitude: number;
  /** Hz; 0 for DC. */
  frequency: number;
  /** Switch-on angle in rad; 0 for DC. */
  phase: number;
  /** Source and fuse together, Ω. */
  resistance: number;
  /** H, may be 0. */
  inductance: number;
  programme: readonly { at: number; switch: 'off' | 'on' }[];
}

export interface ResistanceLaw {
  /** Ω at a body temperature in K. */
  resistance(temperature: number): number;
  /** dR/dT, Ω/K. */
  slope(temperature: number): number;
  /** Body temperature in K for a resistance; null where the law has none. */
  temperature(resistance: number): number | null;
  /** K, inside which the law was given; beyond it the result is flagged as extrapolated. */
  valid: { min: number; max: number };
}

export interface PathElement {
  name: string;
  kind: 'ntc' | 'polymer-ptc' | 'resistor';
  law: ResistanceLaw;
  /** δ, W/K */
  dissipation: number;
  /** C_th, J/K */
  heatCapacity: number;
  bypass: PathBypass | null;
}

export interface PathBypass {
  closes: { when: 'time'; at: number } | { when: 'bus-voltage'; above: number };
  releaseTime: number;
  contactResistance: number;
  behaviour: 'works' | 'never-closes' | 'welded';
}

export type PathLoad =
  | {
      kind: 'constant-power';
      power: number;
      startVoltage: number;
      stopVoltage: number;
      startDelay: number;
      rampTime: number;
      /** Current is clamped at power/clampVoltage (0.3 of the nominal bus). */
      clampVoltage: number;
    }
  | { kind: 'resistance'; resistance: number }
  | { kind: 'none' };
