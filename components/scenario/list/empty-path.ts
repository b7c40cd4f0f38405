import type { ScenarioInput } from '@/shared/model/scenario';

export type SupplyKey = '120' | '230' | 'wide' | '24dc' | '48dc';

interface Supply {
  key: SupplyKey;
  label: string;
  source: Omit<Extract<ScenarioInput['source'], { kind: 'ac' }>, 'impedance'> | Omit<Extract<ScenarioInput['source'], { kind: 'dc' }>, 'impedance'>;
  /** Peak of the lowest supply, V. */
  lowestPeak: number;
}

const crest = (rms: number) => rms * Math.SQRT2;

export const SUPPLIES: readonly Supply[] = [
  { key: '230', label: '230 V', source: { kind: 'ac', voltage: { nominal: 230, tolerance: 0.1 }, frequencies: [50], phase: 'worst' }, lowestPeak: crest(207) },
  { key: '120', label: '120 V', source: { kind: 'ac', voltage: { nominal: 120, tolerance: 0.1 }, frequencies: [60], phase: 'worst' }, lowestPeak: crest(108) },
  { key: 'wide', label: '90–264 V', source: { kind: 'ac', voltage: { nominal: 230, min: 90, max: 264 }, frequencies: [50, 60], phase: 'worst' }, lowestPeak: crest(90) },
  { key: '24dc', label: '24 V DC', source: { kind: 'dc', voltage: { nominal: 24, tolerance: 0.1 } }, lowestPeak: 21.6 },
  { key: '48dc', label: '48 V DC', source: { kind: 'dc', voltage: { nominal: 48, tolerance: 0.1 } }, lowestPeak: 43.2 },
];

export interface FirstFigures {
  prospectiveCurrent: string;
  capacitance: string;
  esr: string;
  power: string;
}

/** What has no usual value and is asked of the person. */
export const FIRST_FIGURES: readonly { key: keyof FirstFigures; path: string; label: string; example: string }[] = [
  { key: 'prospectiveCurrent', path: 'source.impedance', label: 'Prospective current of the supply, A rms', example: '600' },
  { key: 'capacitance', path: 'bulk.capacitance', label: 'Bulk capacitance', example: '470u' },
  { key: 'esr', path: 'bulk.esr', label: 'Its series resistance (ESR)', example: '120m' },
  { key: 'power', path: 'load.power', label: 'Power of the load', example: '300' },
];

const START_SHARE = 0.7;
const DIGITS = 3;

/** A path without limiter or fuse, with the person's figures as typed and the rest as the dialog names it. */
export const emptyPath = (name: string, supply: SupplyKey, figures: FirstFigures): ScenarioInput => {
  const { source, lowestPeak } = SUPPLIES.find(({ key }) => key === supply)!;
  const impedance = { prospectiveCurrent: figures.prospectiveCurrent, reactanceRatio: 0 };
  return {
    name,
    source: { ...source, impedance },
    rectifier: source.kind === 'ac' ? { kind: 'bridge', forwardVoltage: 0.9, slopeResistance: 0.02 } : { kind: 'none' },
    bulk: { capacitance: figures.capacitance, esr: figures.esr },
    load: { kind: 'constant-power', power: figures.power, startVoltage: Number((lowestPeak * START_SHARE).toPrecision(DIGITS)) },
    ambient: { nominal: 298.15, min: 298.15, max: 298.15 },
  };
};
