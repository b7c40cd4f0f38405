import type { Dimension, Qualifier } from '@/shared/quantity/dimension';
import { quantityText } from '@/shared/quantity/format';

import { Text } from './Text';
import { TYPE, type ColorName, type TextVariant } from './tokens';

export interface QuantityProps {
  /** SI; null where there is no figure. */
  value: number | null;
  dimension: Dimension;
  kind?: Qualifier | null;
  significant?: number;
  variant?: TextVariant;
  tone?: ColorName;
  strong?: boolean;
  /** Reserves this many digits after the point, so that points stand under one another in a right-aligned column. */
  decimals?: number;
}

const MONO_SHARE = 0.9;

/** Pads the fraction with spaces, which in the mono face are as wide as a digit. */
export const alignDecimals = (digits: string, decimals: number): string => {
  const point = digits.indexOf('.');
  const present = point < 0 ? -1 : digits.length - point - 1;
  return digits + '\u00a0'.repeat(Math.max(0, decimals - present));
};

/** One value: digits in the mono face, unit in the text face. */
export const Quantity = ({ value, dimension, kind, significant, variant = 'body', tone = 'ink', strong, decimals }: QuantityProps) => {
  if (value === null) return <Text variant={variant} tone="quiet">no figure</Text>;
  const { number, unit } = quantityText(value, dimension, significant);
  const digits = decimals === undefined ? number : alignDecimals(number, decimals);
  const size = TYPE[variant].fontSize;
  const tail = [unit === '°' ? '°' : unit && `\u00a0${unit}`, kind].filter(Boolean).join(' ');
  return (
    <Text variant={variant} tone={tone} strong={strong}>
      <Text variant={variant} tone={tone} strong={strong} mono style={{ fontSize: size * MONO_SHARE, letterSpacing: size * -0.018 }}>
        {digits}
      </Text>
      <Text variant={variant} tone={tone === 'ink' ? 'quiet' : tone} strong={strong}>{tail}</Text>
    </Text>
  );
};
