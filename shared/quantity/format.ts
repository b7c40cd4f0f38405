import { DIMENSIONS, ZERO_CELSIUS, type Dimension } from './dimension';
import { DISPLAY_PREFIXES } from './prefix';

export interface QuantityText {
  /** The digits, with U+2212 as the minus sign; a dash where there is no finite value. */
  number: string;
  /** The unit with its prefix; empty for a count. */
  unit: string;
}

const LARGEST = DISPLAY_PREFIXES[DISPLAY_PREFIXES.length - 1]!;
const FINEST_CELSIUS = 11;

const digitsOf = (value: number, significant: number): string => {
  const text = Number(value.toPrecision(significant)).toString();
  return text.replaceAll('-', '\u2212').replace('e\u2212', 'e-');
};

const withPrefix = (value: number, unit: string, significant: number): QuantityText => {
  const [mantissa, exponentText] = value.toExponential(significant - 1).split('e');
  if (Number(mantissa) === 0) return { number: '0', unit };
  const exponent = Number(exponentText);
  const wanted = Math.floor(exponent / 3) * 3;
  const prefix = DISPLAY_PREFIXES.find((one) => one.exponent >= wanted) ?? LARGEST;
  return { number: digitsOf(Number(`${mantissa}e${exponent - prefix.exponent}`), significant), unit: `${prefix.symbol}${unit}` };
};

/** A quantity in normal notation, digits and unit apart, so that they can be set in their own faces. */
export const quantityText = (value: number, dimension: Dimension, significant = 4): QuantityText => {
  const { unit, prefixed } = DIMENSIONS[dimension];
  const shownUnit = dimension === 'temperature' ? '°C' : unit;
  if (!Number.isFinite(value)) return { number: '\u2013', unit: shownUnit };
  if (prefixed) return withPrefix(value, unit, significant);
  // Rounded first: 273.15 from a sum of floats must not show as 5.7e-14 °C.
  if (dimension === 'temperature') return { number: digitsOf(Number((value - ZERO_CELSIUS).toFixed(FINEST_CELSIUS)), significant), unit: shownUnit };
  return { number: digitsOf(dimension === 'ratio' ? value * 100 : value, significant), unit };
};

export const formatQuantity = (value: number, dimension: Dimension, significant = 4): string => {
  const { number, unit } = quantityText(value, dimension, significant);
  if (!unit) return number;
  return unit === '°' ? `${number}°` : `${number} ${unit}`;
};
