export type Block = 'source' | 'fuse' | 'limiter' | 'rectifier' | 'bulk' | 'load';

/** Every check the engine makes, with the block of the path that carries its mark. */
export const CHECKS = {
  'peak-current': { title: 'Peak current, cold start', block: 'source' },
  'diode-surge': { title: 'Diode surge current', block: 'rectifier' },
  'diode-i2t': { title: 'Diode I²t', block: 'rectifier' },
  'fuse-running-i2t': { title: 'Fuse running I²t', block: 'fuse' },
  'fuse-steady-current': { title: 'Fuse steady current', block: 'fuse' },
  'fuse-breaking-capacity': { title: 'Fuse breaking capacity', block: 'fuse' },
  'limiter-energy': { title: 'Limiter energy, single pulse', block: 'limiter' },
  'limiter-restart-energy': { title: 'Limiter energy, hot restart', block: 'limiter' },
  'limiter-capacitance': { title: 'Capacitance rating, C·V²', block: 'limiter' },
  'limiter-peak-temperature': { title: 'Body temperature, power-up', block: 'limiter' },
  'limiter-steady-temperature': { title: 'Body temperature, steady', block: 'limiter' },
  'limiter-steady-current': { title: 'Limiter steady current', block: 'limiter' },
  'limiter-loss': { title: 'Limiter loss', block: 'limiter' },
  'cold-start-reach': { title: 'Cold start, bus reached', block: 'load' },
  'cold-start-hold': { title: 'Cold start, lowest bus', block: 'load' },
  'restart-peak-current': { title: 'Peak current, hot restart', block: 'limiter' },
  'bypass-second-peak': { title: 'Contact closing, second peak', block: 'limiter' },
  'bypass-load-coincidence': { title: 'Contact closed before load start', block: 'limiter' },
  'bypass-never-closes': { title: 'Body, contact never closes', block: 'limiter' },
  'bypass-welded': { title: 'Peak current, contact welded', block: 'limiter' },
  'ptc-hold': { title: 'Holds at highest ambient', block: 'limiter' },
  'ptc-inrush': { title: 'Does not trip on the inrush', block: 'limiter' },
  'ptc-source-capability': { title: 'Source delivers the trip current', block: 'limiter' },
  'ptc-time-to-trip': { title: 'Time to trip', block: 'limiter' },
  'ptc-maximum-current': { title: 'Prospective current against I_max', block: 'limiter' },
  'ptc-maximum-voltage': { title: 'Voltage against V_max', block: 'limiter' },
  'ptc-voltage-drop': { title: 'Voltage drop at R_1max', block: 'limiter' },
} as const satisfies Record<string, { title: string; block: Block }>;

export type CheckId = keyof typeof CHECKS;
