import type { Dimension, Qualifier } from '@/shared/quantity/dimension';

import { nodeAt, type Draft } from './draft-tree';

export interface Field {
  label: string;
  dimension: Dimension;
  qualifier?: Qualifier;
  /** May be left empty. */
  optional?: true;
  /** Has a tolerance or a range of its own. */
  toleranced?: true;
}

const required = (label: string, dimension: Dimension, qualifier?: Qualifier): Field => ({ label, dimension, ...(qualifier ? { qualifier } : {}) });
const optional = (label: string, dimension: Dimension, qualifier?: Qualifier): Field => ({ ...required(label, dimension, qualifier), optional: true });
const toleranced = (label: string, dimension: Dimension, qualifier?: Qualifier): Field => ({ ...required(label, dimension, qualifier), toleranced: true });

const PART = 'limiter.*.part';
const BYPASS = 'limiter.*.bypass';

/** Every quantity that a person can type into a scenario, by its path; `*` stands for a place in a list. */
export const FIELDS: Readonly<Record<string, Field>> = {
  'source.voltage': toleranced('Line voltage', 'voltage', 'rms'),
  'source.frequencies.*': required('Line frequency', 'frequency'),
  'source.phase': required('Switch-on angle', 'angle'),
  'source.impedance.resistance': toleranced('Source resistance', 'resistance'),
  'source.impedance.inductance': toleranced('Source inductance', 'inductance'),
  'source.impedance.prospectiveCurrent': toleranced('Prospective current', 'current', 'rms'),
  'source.impedance.reactanceRatio': required('X/R of the supply', 'count'),
  'source.programme.*.at': required('Time after first switch-on', 'time'),
  'fuse.ratedCurrent': required('Rated current', 'current', 'rms'),
  'fuse.deratedCurrent': optional('Rating at highest ambient', 'current', 'rms'),
  'fuse.breakingCapacity': optional('Breaking capacity', 'current', 'rms'),
  'fuse.pulseFactor': optional('Share of I²t allowed for all starts', 'ratio'),
  'fuse.resistance': optional('Cold resistance', 'resistance'),
  'fuse.preArcing.*.time': required('Pre-arcing time', 'time'),
  'fuse.preArcing.*.i2t': required('Minimum pre-arcing I²t', 'i2t'),
  [`${PART}.law.r25`]: toleranced('Resistance at 25 °C', 'resistance'),
  [`${PART}.law.b`]: toleranced('B-value (25/85)', 'temperatureInterval'),
  [`${PART}.law.tolerance`]: optional('Tolerance of the resistance', 'ratio'),
  [`${PART}.law.low`]: toleranced('Resistance below the knee', 'resistance'),
  [`${PART}.law.high`]: required('Resistance above the knee', 'resistance'),
  [`${PART}.law.midpoint`]: required('Middle of the rise', 'temperature'),
  [`${PART}.law.width`]: required('Width of the rise', 'temperatureInterval'),
  [`${PART}.law.resistance`]: toleranced('Resistance', 'resistance'),
  [`${PART}.law.points.*.temperature`]: required('Body temperature', 'temperature'),
  [`${PART}.law.points.*.resistance`]: required('Zero-power resistance', 'resistance'),
  [`${PART}.thermal.dissipation`]: required('Dissipation factor', 'dissipation'),
  [`${PART}.thermal.timeConstant`]: required('Thermal time constant', 'time'),
  [`${PART}.thermal.heatCapacity`]: required('Heat capacity', 'heatCapacity'),
  [`${PART}.ratings.maximumTemperature`]: optional('Highest body temperature', 'temperature'),
  [`${PART}.ratings.steadyCurrent.current`]: required('Highest steady current', 'current', 'rms'),
  [`${PART}.ratings.steadyCurrent.ambient`]: required('… up to this ambient', 'temperature'),
  [`${PART}.ratings.energy.energy`]: required('Highest energy of one pulse', 'energy'),
  [`${PART}.ratings.energy.startTemperature`]: optional('… from this body temperature', 'temperature'),
  [`${PART}.ratings.energy.pulses`]: optional('… for this many pulses', 'count'),
  [`${PART}.ratings.capacitance.capacitance`]: required('Highest capacitance', 'capacitance'),
  [`${PART}.ratings.capacitance.voltage`]: required('… stated at', 'voltage'),
  [`${PART}.ratings.maximumVoltage`]: optional('V_max', 'voltage'),
  [`${PART}.ratings.maximumCurrent`]: optional('I_max', 'current'),
  [`${BYPASS}.closes.at`]: required('Closes at', 'time'),
  [`${BYPASS}.closes.above`]: required('Closes above bus', 'voltage'),
  [`${BYPASS}.releaseTime`]: required('Opens after power-off', 'time'),
  [`${BYPASS}.contactResistance`]: required('Contact resistance', 'resistance'),
  [`${BYPASS}.makingCurrent`]: optional('Making current rating', 'current', 'peak'),
  'rectifier.forwardVoltage': required('Threshold of one diode', 'voltage'),
  'rectifier.slopeResistance': required('Slope resistance', 'resistance'),
  'rectifier.surge.current': required('Surge rating, half sine', 'current', 'peak'),
  'rectifier.surge.pulseWidth': required('… of this width', 'time'),
  'rectifier.surge.i2t': optional('I²t rating', 'i2t'),
  'bulk.capacitance': toleranced('Capacitance', 'capacitance'),
  'bulk.esr': toleranced('Series resistance (ESR)', 'resistance'),
  'bulk.initialVoltage': optional('Voltage before switch-on', 'voltage'),
  'bulk.bleeder': optional('Bleeder across the bus', 'resistance'),
  'bulk.atLowAmbient.capacitanceFactor': required('Capacitance, share of 20 °C value', 'ratio'),
  'bulk.atLowAmbient.esrFactor': required('ESR, times its 20 °C value', 'count'),
  'load.power': required('Constant power', 'power'),
  'load.startVoltage': required('Starts at', 'voltage'),
  'load.stopVoltage': optional('Stops at', 'voltage'),
  'load.startDelay': optional('Start delay', 'time'),
  'load.rampTime': optional('Soft-start ramp', 'time'),
  'load.resistance': required('Load resistance', 'resistance'),
  'fault.at': required('Fault begins at', 'time'),
  'fault.resistance': required('Fault resistance', 'resistance'),
  ambient: toleranced('Ambient at the part', 'temperature'),
  duration: required('Length of the run', 'time'),
  cautionBelow: optional('Caution below a margin of', 'ratio'),
  'limits.peakCurrent': optional('Peak current allowed', 'current', 'peak'),
  'limits.limiterLoss': optional('Loss allowed in the limiter', 'power'),
  'limits.timeToTrip': optional('Time allowed to trip', 'time'),
  'limits.voltageDrop': optional('Drop allowed over a PTC', 'voltage'),
  'limits.steadyCurrent': optional('Current that a PTC must hold', 'current', 'rms'),
};

const patternOf = (path: string) => path.replace(/\.\d+(?=\.|$)/g, '.*');

/** The quantity field at a path of this draft; undefined for choices, names and whole blocks. */
export const fieldAt = (draft: Draft, path: string): Field | undefined => {
  if (path === 'source.voltage' && nodeAt(draft, 'source.kind') === 'dc') return toleranced('Supply voltage', 'voltage');
  return FIELDS[patternOf(path)];
};
