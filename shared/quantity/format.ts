import { DIMENSIONS, type Dimension } from './dimension';
import { DISPLAY_PREFIXES } from './prefix';

export interface QuantityText {
  /** The digits, with U+2212 as the minus sign. */
  number: string;
  /** The unit with its prefix; empty for a count. */
  unit: string;
}

const ZERO_CELSIUS = 273.15;
const PREFIXED = new Set<Dimension>(['resistance', 'capacitance', 'inductance', 'voltage', 'current', 'power', 'energy', 'time', 'frequency', 'dissipation', 'heatCapacity']);

const digitsOf = (value: number, significant: number): string => {
  const text = Number(value.toPrecision(significant)).toString();
  return text.replace('-', '\u2212');
};

const withPrefix = (value: number, unit: string, significant: number): QuantityText => {
  const rounded = Number(value.toPrecision(significant));
  if (rounded === 0) return { number: '0', unit };
  const wanted = Math.floor(Math.log10(Math.abs(rounded)) / 3 + 1e-12) * 3;
  const last = DISPLAY_PREFIXES[DISPLAY_PREFIXES.length - 1]!;
  const prefix = DISPLAY_PREFIXES.find((one) => one.exponent >= wanted) ?? last;
  return { number: digitsOf(rounded / 10 ** prefix.exponent, significant), unit: `${prefix.symbol}${unit}` };
};

/** A quantity in normal notation, digits and unit apart, so that they can be set in their own faces. */
export const quantityText = (value: number, dimension: Dimension, significant = 4): QuantityText => {
  const { unit } = DIMENSIONS[dimension];
  if (dimension === 'temperature') return { number: digitsOf(value - ZERO_CELSIUS, significant), unit: '°C' };
  if (dimension === 'ratio') return { number: digitsOf(value * 100, significant), unit };
  if (PREFIXED.has(dimension)) return withPrefix(value, unit, significant);
  return { number: digitsOf(value, significant), unit };
};

export const formatQuantity = (value: number, dimension: Dimension, significant = 4): string => {
  const { number, unit } = quantityText(value, dimension, significant);
  if (!unit) return number;
  return unit === '°' ? `${number}°` : `${number} ${unit}`;
};
