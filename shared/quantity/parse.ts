import { create, unitDependencies, type Unit } from 'mathjs';

import { DIMENSIONS, type Dimension, type Qualifier } from './dimension';
import { PREFIX_FACTOR } from './prefix';

export type Parsed<T> = ({ ok: true } & T) | { ok: false; message: string };
export type ParsedQuantity = Parsed<{ value: number; qualifier: Qualifier | null }>;

const ZERO_CELSIUS = 273.15;
const NUMBER = String.raw`[+-]?(?:\d+(?:\.\d*)?|\.\d+)(?:[eE][+-]?\d+)?`;
/** Letters that IEC 60062 and common usage put in place of the decimal point, for each dimension. */
const MARKING_LETTERS: Partial<Record<Dimension, string>> = {
  resistance: 'RLmkKMG', capacitance: 'Fpnum', inductance: 'Hnum', voltage: 'Vmk', current: 'Aum', power: 'Wmk',
  energy: 'Jmk', time: 'sum', frequency: 'Hk', temperatureInterval: 'kK',
};
const MATH_UNIT: Partial<Record<Dimension, string>> = {
  resistance: 'ohm', capacitance: 'F', inductance: 'H', voltage: 'V', current: 'A', power: 'W', energy: 'J', time: 's',
  frequency: 'Hz', temperatureInterval: 'K', dissipation: 'W/K', heatCapacity: 'J/K', i2t: 'A^2 s',
};

let unitOf: ((text: string) => Unit) | undefined;
const readUnit = (text: string): Unit | null => {
  unitOf ??= create({ ...unitDependencies }).unit as (text: string) => Unit;
  try {
    return unitOf(text);
  } catch {
    return null;
  }
};

const normalise = (text: string) =>
  text
    .trim()
    .replace(/[\u00a0\u202f\u2009]/g, ' ')
    .replace(/\u2212/g, '-')
    .replace(/[\u00b5\u03bc]/g, 'u')
    .replace(/[\u03a9\u2126]/g, 'ohm')
    .replace(/A²\s*·?\s*s/g, 'A^2 s')
    .replace(/(\d),(\d)/g, '$1.$2');

const takeQualifier = (text: string): { rest: string; qualifier: Qualifier | null } => {
  const match = /\s*\b(rms|peak|pk)$/i.exec(text);
  if (!match) return { rest: text, qualifier: null };
  const qualifier = match[1]!.toLowerCase() === 'rms' ? 'rms' : 'peak';
  return { rest: text.slice(0, match.index), qualifier };
};

/** `4k7`, `R47`, `3V3`, `2R5`: a letter in place of the decimal point (IEC 60062). */
const readMarking = (text: string, dimension: Dimension): number | null => {
  const letters = MARKING_LETTERS[dimension];
  const match = letters && new RegExp(`^(\\d*)([${letters}])(\\d+)$`).exec(text);
  if (!match) return null;
  const [, whole, letter, fraction] = match;
  const factor = letter === 'K' ? 1e3 : (letter === 'L' ? 1e-3 : (PREFIX_FACTOR[letter!] ?? 1));
  return Number(`${whole || '0'}.${fraction}`) * factor;
};

const readTemperature = (number: number, suffix: string): number | null => {
  if (suffix === '' || suffix === '°C' || suffix === 'C' || suffix === 'degC') return number + ZERO_CELSIUS;
  return suffix === 'K' ? number : null;
};

const readSuffixed = (number: number, suffix: string, dimension: Dimension): number | null => {
  if (dimension === 'temperature') return readTemperature(number, suffix);
  if (dimension === 'ratio') return suffix === '%' || suffix === '' ? number / 100 : null;
  if (dimension === 'angle') return suffix === '' || suffix === '°' || suffix === 'deg' ? number : null;
  if (suffix === '') return number;
  const factor = PREFIX_FACTOR[suffix === 'K' && dimension !== 'temperatureInterval' ? 'k' : suffix];
  if (factor !== undefined) return number * factor;
  const base = MATH_UNIT[dimension];
  if (!base) return null;
  const unit = readUnit(`1 ${suffix}`);
  return unit?.equalBase(readUnit(base)!) ? number * unit.toNumber(base) : null;
};

/**
 * Reads a quantity as an engineer types it (`470u`, `470 µF`, `4k7`, `R47`, `500mA`, `1.5e-9`, decimal comma).
 * A bare number is in the SI unit, except temperatures (°C) and ratios (per cent).
 * @returns the SI value, or a sentence with an example
 */
export const parseQuantity = (text: string, dimension: Dimension): ParsedQuantity => {
  const { rest, qualifier } = takeQualifier(normalise(text));
  const marked = readMarking(rest, dimension);
  if (marked !== null) return { ok: true, value: marked, qualifier };
  const match = new RegExp(`^(${NUMBER})\\s*(.*)$`).exec(rest);
  const value = match ? readSuffixed(Number(match[1]), match[2]!.trim(), dimension) : null;
  if (value !== null && Number.isFinite(value)) return { ok: true, value, qualifier };
  const { unit, example } = DIMENSIONS[dimension];
  const asked = dimension === 'temperature' ? '°C' : unit;
  const said = text.trim() === '' ? 'nothing was written' : `"${text.trim()}" is not a value${asked ? ` in ${asked}` : ''}`;
  return { ok: false, message: `${said}; write for example ${example}` };
};

/** `470u ±20 %`: a value with a symmetric tolerance as a fraction; without one the tolerance is 0. */
export const parseTolerancedText = (text: string, dimension: Dimension): Parsed<{ value: number; tolerance: number }> => {
  const [valueText = '', toleranceText, ...more] = text.split(/±|\+\/-/);
  const value = parseQuantity(valueText, dimension);
  if (!value.ok) return value;
  if (toleranceText === undefined) return { ok: true, value: value.value, tolerance: 0 };
  const tolerance = parseQuantity(toleranceText, 'ratio');
  if (!tolerance.ok) return tolerance;
  if (more.length > 0 || tolerance.value < 0 || tolerance.value >= 1)
    return { ok: false, message: 'the tolerance lies between 0 % and 99.9 %; write for example 470u ±20 %' };
  return { ok: true, value: value.value, tolerance: tolerance.value };
};
