import { DIMENSIONS, type Dimension } from '@/shared/quantity/dimension';
import { quantityText } from '@/shared/quantity/format';

/** Enough digits that a value shown and read back is the same. */
const FULL = 12;

/** An SI value as a person would type it into its field: `4.7k`, `300m`, `40` (°C), `20 %`. */
export const asTyped = (value: number, dimension: Dimension): string => {
  const { number, unit } = quantityText(value, dimension, FULL);
  const plain = number.replace('\u2212', '-');
  if (dimension === 'ratio') return `${plain} %`;
  const base = DIMENSIONS[dimension].unit;
  const prefix = unit.endsWith(base) ? unit.slice(0, unit.length - base.length) : '';
  return `${plain}${prefix}`;
};
