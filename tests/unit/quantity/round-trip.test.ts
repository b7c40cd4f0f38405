import fc from 'fast-check';

import { DIMENSIONS, ZERO_CELSIUS, type Dimension } from '../../../shared/quantity/dimension';
import { formatQuantity } from '../../../shared/quantity/format';
import { parseQuantity } from '../../../shared/quantity/parse';

const RUNS = 10_000;
const FULL_DIGITS = 15;
const WITHIN = 1e-12;

/** Any sign, 30 decades; a temperature stays above absolute zero and finite in °C. */
const values = (dimension: Dimension) => {
  const magnitude = fc.tuple(fc.double({ min: 1, max: 10, noNaN: true }), fc.integer({ min: -15, max: 15 }), fc.boolean());
  const anySize = magnitude.map(([digits, exponent, negative]) => (negative ? -1 : 1) * digits * 10 ** exponent);
  return dimension === 'temperature' ? fc.double({ min: 1, max: 2000, noNaN: true }) : fc.oneof(anySize, fc.constant(0));
};

describe('what is shown can be typed again', () => {
  it.each(Object.keys(DIMENSIONS) as Dimension[])('%s: 10,000 round trips within 1e-12', (dimension) => {
    fc.assert(
      fc.property(values(dimension), (value) => {
        const text = formatQuantity(value, dimension, FULL_DIGITS);
        const parsed = parseQuantity(text, dimension);
        const scale = dimension === 'temperature' ? Math.max(value, ZERO_CELSIUS) : Math.abs(value);
        return parsed.ok && Math.abs(parsed.value - value) <= WITHIN * scale;
      }),
      { numRuns: RUNS },
    );
  });
});

describe('no text makes the reader throw', () => {
  it('10,000 arbitrary texts in every dimension', () => {
    const piece = fc.constantFrom('4', '7', '.', ',', 'k', 'K', 'M', 'm', 'R', 'e', '-', '+', '±', '%', ' ', 'Ω', 'µ', 'F', 'A', '^2', 's', '/K', '°C', 'rms', '\u202f', '(', '*');
    const text = fc.oneof(fc.string({ maxLength: 70 }), fc.array(piece, { maxLength: 8 }).map((pieces) => pieces.join('')));
    fc.assert(
      fc.property(text, fc.constantFrom(...(Object.keys(DIMENSIONS) as Dimension[])), (typed, dimension) => {
        const parsed = parseQuantity(typed, dimension);
        return parsed.ok ? Number.isFinite(parsed.value) : parsed.message.includes('write for example');
      }),
      { numRuns: RUNS },
    );
  });
});
