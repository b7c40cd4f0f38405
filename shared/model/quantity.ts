import { z } from 'zod';

import { DIMENSIONS, type Dimension } from '../quantity/dimension';
import { formatQuantity } from '../quantity/format';
import { parseQuantity, parseTolerancedText } from '../quantity/parse';

export interface QuantityRange {
  /** SI, inclusive. */
  min: number;
  /** SI, inclusive. */
  max: number;
  /** What the field is, for the JSON Schema. */
  describe: string;
}

/** A quantity with its tolerance band resolved. SI. */
export interface Toleranced {
  nominal: number;
  min: number;
  max: number;
}

type Raw = number | string;
type Issue = (message: string, path?: string[]) => void;

const rawQuantity = (dimension: Dimension) =>
  z.union([z.number(), z.string().max(64)], {
    error: `write a number in ${DIMENSIONS[dimension].unit || 'units of one'}, or text such as "${DIMENSIONS[dimension].example}"`,
  });

const issueOn =
  (context: z.RefinementCtx): Issue =>
  (message, path = []) =>
    context.addIssue({ code: 'custom', message, path });

const readSingle = (raw: Raw, dimension: Dimension, issue: Issue): number | null => {
  if (typeof raw === 'number') return raw;
  const parsed = parseQuantity(raw, dimension);
  if (parsed.ok) return parsed.value;
  issue(parsed.message);
  return null;
};

const refuseOutside = (value: number, dimension: Dimension, range: QuantityRange, issue: Issue): boolean => {
  if (value >= range.min && value <= range.max) return false;
  const [text, min, max] = [value, range.min, range.max].map((one) => formatQuantity(one, dimension));
  issue(`${text} is outside ${min} to ${max}`);
  return true;
};

const metaOf = (dimension: Dimension, range: QuantityRange) => ({
  description: `${range.describe}, from ${formatQuantity(range.min, dimension)} to ${formatQuantity(range.max, dimension)}`,
  unit: DIMENSIONS[dimension].unit,
});

/** One physical quantity: an SI number or text as an engineer types it; an SI number inside. */
export const quantity = (dimension: Dimension, range: QuantityRange) =>
  rawQuantity(dimension)
    .transform((raw, context): number => {
      const issue = issueOn(context);
      const value = readSingle(raw, dimension, issue);
      return value === null || refuseOutside(value, dimension, range, issue) ? z.NEVER : value;
    })
    .meta(metaOf(dimension, range));

/** A quantity, or one word in its place, such as "worst". */
export const quantityOr = <Word extends string>(word: Word, dimension: Dimension, range: QuantityRange) =>
  rawQuantity(dimension)
    .transform((raw, context): number | Word => {
      if (raw === word) return word;
      const issue = issueOn(context);
      const value = readSingle(raw, dimension, issue);
      return value === null || refuseOutside(value, dimension, range, issue) ? z.NEVER : value;
    })
    .meta({ ...metaOf(dimension, range), description: `${metaOf(dimension, range).description}, or "${word}"` });

const toBand = (nominal: number, fraction: number): Toleranced => ({
  nominal,
  min: nominal * (1 - fraction),
  max: nominal * (1 + fraction),
});

interface RawBand {
  nominal: Raw;
  tolerance?: Raw | undefined;
  min?: Raw | undefined;
  max?: Raw | undefined;
}

const readBand = (raw: RawBand, dimension: Dimension, issue: Issue): Toleranced | null => {
  const read = (key: keyof RawBand, as: Dimension) => {
    const given = raw[key];
    return given === undefined ? undefined : readSingle(given, as, (message) => issue(message, [key]));
  };
  const nominal = read('nominal', dimension);
  const tolerance = read('tolerance', 'ratio');
  const [min, max] = [read('min', dimension), read('max', dimension)];
  if (nominal === null || nominal === undefined || tolerance === null || min === null || max === null) return null;
  if (tolerance === undefined) return { nominal, min: min ?? nominal, max: max ?? nominal };
  if (min !== undefined || max !== undefined) issue('give either a tolerance or min and max, not both');
  else if (tolerance >= 0 && tolerance < 1) return toBand(nominal, tolerance);
  else issue('the tolerance is outside 0 % to 99.9 %', ['tolerance']);
  return null;
};

/**
 * A quantity with a tolerance: a bare value, text such as "470u ±20 %", `{nominal, tolerance}` or
 * `{nominal, min, max}`. Inside always `{nominal, min, max}`, in SI.
 */
export const toleranced = (dimension: Dimension, range: QuantityRange) => {
  const raw = rawQuantity(dimension);
  const object = z.strictObject({
    nominal: raw,
    tolerance: rawQuantity('ratio').optional(),
    min: raw.optional(),
    max: raw.optional(),
  });
  return z
    .union([z.number(), z.string().max(64), object], {
      error: `write a value such as "${DIMENSIONS[dimension].example}", or an object with nominal and either tolerance, or min and max`,
    })
    .transform((given, context): Toleranced => {
      const issue = issueOn(context);
      let band: Toleranced | null = null;
      if (typeof given === 'number') band = toBand(given, 0);
      else if (typeof given === 'object') band = readBand(given, dimension, issue);
      else {
        const parsed = parseTolerancedText(given, dimension);
        if (parsed.ok) band = toBand(parsed.value, parsed.tolerance);
        else issue(parsed.message);
      }
      if (!band) return z.NEVER;
      for (const value of [band.min, band.max, band.nominal]) {
        if (refuseOutside(value, dimension, range, issue)) return z.NEVER;
      }
      if (band.min <= band.nominal && band.nominal <= band.max) return band;
      issue('min, nominal and max must rise in this order');
      return z.NEVER;
    })
    .meta(metaOf(dimension, range));
};
