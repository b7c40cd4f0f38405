import type { Part, Ratings } from '@/shared/model/part';
import type { Toleranced } from '@/shared/model/quantity';
import type { Dimension, Qualifier } from '@/shared/quantity/dimension';
import { formatQuantity } from '@/shared/quantity/format';

/** One figure of a part as its record gives it. SI; null where the record holds none. */
export interface PartFigure {
  /** Where it stands inside the part, such as `law.r25`; its source is filed under the same path. */
  path: string;
  label: string;
  dimension: Dimension;
  kind: Qualifier | null;
  min: number | null;
  typical: number | null;
  max: number | null;
  condition: string;
}

type Bound = 'typical' | 'max';

const figure = (path: string, label: string, dimension: Dimension, rest: Partial<PartFigure>): PartFigure => ({
  path, label, dimension, kind: null, min: null, typical: null, max: null, condition: '', ...rest,
});
const single = (path: string, label: string, dimension: Dimension, value: number | undefined, bound: Bound, condition = '', kind: Qualifier | null = null) =>
  figure(path, label, dimension, { [bound]: value ?? null, condition, kind });
const band = (path: string, label: string, dimension: Dimension, { nominal, min, max }: Toleranced, condition: string) =>
  figure(path, label, dimension, { min: min < nominal ? min : null, typical: nominal, max: max > nominal ? max : null, condition });

const lawFigures = ({ kind, law }: Part): PartFigure[] => {
  switch (law.law) {
    case 'b-value':
      return [band('law.r25', 'R25', 'resistance', law.r25, '25 °C, zero power'), band('law.b', 'B (25/85)', 'temperatureInterval', law.b, '')];
    case 'sigmoid':
      return [
        band('law.low', 'R_min, typical, R_1max', 'resistance', law.low, 'below the knee'),
        single('law.high', 'Resistance, tripped', 'resistance', law.high, 'typical', 'far above the knee'),
        single('law.midpoint', 'Middle of the rise', 'temperature', law.midpoint, 'typical'),
        single('law.width', 'Width of the rise', 'temperatureInterval', law.width, 'typical'),
      ];
    case 'fixed':
      return [band('law.resistance', 'Resistance', 'resistance', law.resistance, '')];
    case 'steinhart-hart':
    case 'table':
      return [single('law.tolerance', kind === 'ntc' ? 'Tolerance of R(T)' : 'Tolerance', 'ratio', law.tolerance, 'max', law.law === 'table' ? `table of ${law.points.length} points` : 'Steinhart–Hart coefficients')];
  }
};

const thermalFigures = ({ thermal }: Part): PartFigure[] => [
  single('thermal.dissipation', 'Dissipation factor', 'dissipation', thermal.dissipation, 'typical'),
  'timeConstant' in thermal
    ? single('thermal.timeConstant', 'Thermal time constant', 'time', thermal.timeConstant, 'typical')
    : single('thermal.heatCapacity', 'Heat capacity', 'heatCapacity', thermal.heatCapacity, 'typical'),
];

const BASIS: Record<NonNullable<Ratings['energy']>['basis'], string> = {
  absorbed: 'absorbed', 'half-cv2-rms': '½CV², V rms', 'half-cv2-peak': '½CV², V peak', unknown: 'basis not stated',
};
const celsius = (kelvin: number) => formatQuantity(kelvin, 'temperature', 3);

const energyCondition = (energy: Ratings['energy']) =>
  energy ? [BASIS[energy.basis], `from ${celsius(energy.startTemperature)}`, energy.pulses ? `${energy.pulses.toLocaleString('en').replaceAll(',', '\u202f')} pulses` : ''].filter(Boolean).join(', ') : '';

const ratingFigures = ({ kind, ratings }: Part): PartFigure[] => {
  const { maximumTemperature, steadyCurrent, energy, capacitance, maximumVoltage, maximumCurrent } = ratings;
  const common = [
    single('ratings.maximumTemperature', 'Highest body temperature', 'temperature', maximumTemperature, 'max'),
    single('ratings.steadyCurrent', 'Steady current', 'current', steadyCurrent?.current, 'max', steadyCurrent ? `up to ${celsius(steadyCurrent.ambient)}` : '', 'rms'),
    single('ratings.energy', 'Energy, one pulse', 'energy', energy?.energy, 'max', energyCondition(energy)),
  ];
  const capacitor = single('ratings.capacitance', 'Capacitance rating', 'capacitance', capacitance?.capacitance, 'max', capacitance ? `at ${formatQuantity(capacitance.voltage, 'voltage', 3)} ${capacitance.voltageIs}` : '');
  const fault = [
    single('ratings.maximumVoltage', 'V_max', 'voltage', maximumVoltage, 'max'),
    single('ratings.maximumCurrent', 'I_max', 'current', maximumCurrent, 'max', 'fault current'),
  ];
  if (kind === 'polymer-ptc') return [common[0]!, ...fault];
  return kind === 'ntc' ? [...common, capacitor] : common;
};

/** Every figure that the checks of this kind of part need, the missing ones included. */
export const figuresOf = (part: Part): PartFigure[] => [...lawFigures(part), ...thermalFigures(part), ...ratingFigures(part)];

export const isGiven = ({ min, typical, max }: PartFigure) => min !== null || typical !== null || max !== null;

export const KIND_TEXT: Record<Part['kind'], string> = {
  ntc: 'NTC inrush current limiter',
  'polymer-ptc': 'Polymer PTC resettable fuse',
  resistor: 'Fixed resistor',
};
export const KIND_SHORT: Record<Part['kind'], string> = { ntc: 'NTC', 'polymer-ptc': 'PPTC', resistor: 'Resistor' };
