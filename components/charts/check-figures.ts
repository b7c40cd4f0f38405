import type { Check } from '@/shared/model/check';
import type { Dimension } from '@/shared/quantity/dimension';
import { DIMENSIONS } from '@/shared/quantity/dimension';
import { quantityText } from '@/shared/quantity/format';
import { DISPLAY_PREFIXES } from '@/shared/quantity/prefix';

export interface PairText {
  value: string;
  rating: string;
  unit: string;
}

const SIGNIFICANT = 4;
const factorOf = (shown: string, dimension: Dimension): number => {
  const prefix = DISPLAY_PREFIXES.find(({ symbol }) => symbol !== '' && `${symbol}${DIMENSIONS[dimension].unit}` === shown);
  return prefix ? 10 ** prefix.exponent : 1;
};
const hasPrefix = (dimension: Dimension) => dimension !== 'temperature' && dimension !== 'ratio';

/** Four digits at most, and no more after the point than the eye compares. */
const rounded = (value: number): string => {
  const decimals = Math.max(0, Math.min(2, SIGNIFICANT - 1 - Math.floor(Math.log10(Math.max(Math.abs(value), 1e-9)))));
  const text = Math.abs(value) < 0.1 ? Number(value.toPrecision(2)).toString() : Number(value.toFixed(decimals)).toString();
  return text.replace('-', '\u2212');
};

/** Value and rating in one unit, the rating's, so that they can be compared by eye: never 800 m against 1.5. */
export const pairText = (value: number, rating: number, dimension: Dimension): PairText => {
  const shown = quantityText(rating, dimension, SIGNIFICANT);
  if (!hasPrefix(dimension)) return { value: quantityText(value, dimension, SIGNIFICANT).number, rating: shown.number, unit: shown.unit };
  return { value: rounded(value / factorOf(shown.unit, dimension)), rating: shown.number, unit: shown.unit };
};

/** The margin with its sign, in per cent; null where nothing was assessed. */
export const marginText = ({ margin }: Pick<Check, 'margin'>): string | null => {
  if (margin === null) return null;
  const percent = margin * 100;
  const digits = Math.abs(percent) < 9.95 ? Math.abs(percent).toFixed(1).replace(/\.0$/, '') : Math.abs(percent).toFixed(0);
  return `${percent < 0 && digits !== '0' ? '\u2212' : '+'}${digits}\u00a0%`;
};
