import type { CheckId } from '@/shared/model/check-list';

interface CheckWords {
  /** In a sentence, before the worst value. */
  lead: string;
  /** On the path strip, beside the mark. */
  short: string;
}

export const CHECK_WORDS: Record<CheckId, CheckWords> = {
  'peak-current': { lead: 'A cold start draws', short: 'peak current' },
  'diode-surge': { lead: 'A diode carries', short: 'surge' },
  'diode-i2t': { lead: 'A diode takes', short: 'I²t' },
  'fuse-running-i2t': { lead: 'A start takes from the fuse', short: 'running I²t' },
  'fuse-steady-current': { lead: 'The fuse carries', short: 'steady current' },
  'fuse-breaking-capacity': { lead: 'A short circuit draws', short: 'breaking capacity' },
  'limiter-energy': { lead: 'One start puts into the limiter', short: 'pulse energy' },
  'limiter-restart-energy': { lead: 'A hot restart puts into the limiter', short: 'restart energy' },
  'limiter-capacitance': { lead: 'The capacitor holds, as C·V²,', short: 'C·V² rating' },
  'limiter-peak-temperature': { lead: 'In the power-up the body reaches', short: 'peak body heat' },
  'limiter-steady-temperature': { lead: 'In operation the body stays at', short: 'body heat' },
  'limiter-steady-current': { lead: 'In operation the limiter carries', short: 'steady current' },
  'limiter-loss': { lead: 'In operation the limiter loses', short: 'loss' },
  'cold-start-reach': { lead: 'Started cold, the bus reaches', short: 'cold start' },
  'cold-start-hold': { lead: 'Started cold, the load pulls the bus down to', short: 'cold start' },
  'restart-peak-current': { lead: 'Hot restart draws', short: 'hot restart' },
  'bypass-second-peak': { lead: 'The closing contact takes', short: 'contact closing' },
  'bypass-load-coincidence': { lead: 'Between contact and load start lie', short: 'load start' },
  'bypass-never-closes': { lead: 'If the contact never closes, the body reaches', short: 'contact open' },
  'bypass-welded': { lead: 'With a welded contact a start draws', short: 'contact welded' },
  'ptc-hold': { lead: 'At the highest ambient the PTC holds', short: 'hold' },
  'ptc-inrush': { lead: 'The inrush heats the PTC to', short: 'trip on inrush' },
  'ptc-source-capability': { lead: 'Into the fault the source delivers', short: 'trip current' },
  'ptc-time-to-trip': { lead: 'On the smallest fault the PTC trips after', short: 'time to trip' },
  'ptc-maximum-current': { lead: 'The source can drive', short: 'I_max' },
  'ptc-maximum-voltage': { lead: 'Tripped, the PTC stands against', short: 'V_max' },
  'ptc-voltage-drop': { lead: 'In operation the PTC drops', short: 'voltage drop' },
};
