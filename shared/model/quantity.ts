import { z } from 'zod';

import { DIMENSIONS, numberUnit, type Dimension, type Qualifier } from '../quantity/dimension';
import { formatQuantity } from '../quantity/format';
import { parseQuantity, parseTolerancedText } from '../quantity/parse';

export interface QuantityRange {
  /** SI, inclusive. */
  min: number;
  /** SI, inclusive. */
  max: number;
  /** What the field is, for the JSON Schema. */
  describe: string;
  /** How a current or voltage is meant; text that says otherwise is refused. */
  qualifier?: Qualifier;
}

/** A quantity with its tolerance band resolved. SI. */
export interface Toleranced {
  nominal: number;
  min: number;
  max: number;
}

type Raw = number | string;
type Issue = (message: string, path?: string[]) => void;

const missingOr = (input: unknown) => (input === undefined ? 'is missing: ' : '');

const numberIn = (dimension: Dimension) => {
  if (dimension === 'ratio') return 'a fraction of one';
  const unit = numberUnit(dimension);
  return unit ? `a number in ${unit}` : 'a number';
};

const rawQuantity = (dimension: Dimension) =>
  z.union([z.number(), z.string().max(64)], {
    error: ({ input }) => `${missingOr(input)}write ${numberIn(dimension)}, or text such as "${DIMENSIONS[dimension].example}"`,
  });

const issueOn =
  (context: z.RefinementCtx): Issue =>
  (message, path = []) =>
    context.addIssue({ code: 'custom', message, path });

/** Says why when a value marked rms or peak meets a field that is meant otherwise. */
const refuseQualifier = (given: Qualifier | null, dimension: Dimension, wanted: Qualifier | undefined, issue: Issue): boolean => {
  if (given === null || given === wanted) return false;
  const { unit } = DIMENSIONS[dimension];
  if (wanted) issue(`this field is in ${unit} ${wanted}, not ${given}; write for example 16 ${unit} ${wanted}`);
  else issue(`this field takes neither rms nor peak; write it without "${given}"`);
  return true;
};

const readSingle = (raw: Raw, dimension: Dimension, wanted: Qualifier | undefined, issue: Issue): number | null => {
  if (typeof raw === 'number') return raw;
  const parsed = parseQuantity(raw, dimension);
  if (parsed.ok) return refuseQualifier(parsed.qualifier, dimension, wanted, issue) ? null : parsed.value;
  issue(parsed.message);
  return null;
};

/** −40 °C less 40 K is −80 °C but for the last digit of a float. */
const FLOAT_SLACK = 1e-12;

const refuseOutside = (value: number, dimension: Dimension, range: QuantityRange, issue: Issue): boolean => {
  if (value >= range.min * (1 - FLOAT_SLACK) && value <= range.max * (1 + FLOAT_SLACK)) return false;
  const [text, min, max] = [value, range.min, range.max].map((one) => formatQuantity(one, dimension));
  issue(`${text} is outside ${min} to ${max}`);
  return true;
};

const metaOf = (dimension: Dimension, range: QuantityRange) => ({
  description: `${range.describe}, from ${formatQuantity(range.min, dimension)} to ${formatQuantity(range.max, dimension)}`,
  unit: numberUnit(dimension),
  ...(range.qualifier && { qualifier: range.qualifier }),
});

/** One physical quantity: an SI number or text as an engineer types it; an SI number inside. */
export const quantity = (dimension: Dimension, range: QuantityRange) =>
  rawQuantity(dimension)
    .transform((raw, context): number => {
      const issue = issueOn(context);
      const value = readSingle(raw, dimension, range.qualifier, issue);
      return value === null || refuseOutside(value, dimension, range, issue) ? z.NEVER : value;
    })
    .meta(metaOf(dimension, range));

/** A quantity, or one word in its place, such as "worst". */
export const quantityOr = <Word extends string>(word: Word, dimension: Dimension, range: QuantityRange) =>
  rawQuantity(dimension)
    .transform((raw, context): number | Word => {
      if (raw === word) return word;
      const issue = issueOn(context);
      const value = readSingle(raw, dimension, range.qualifier, issue);
      return value === null || refuseOutside(value, dimension, range, issue) ? z.NEVER : value;
    })
    .meta({ ...metaOf(dimension, range), description: `${metaOf(dimension, range).description}, or "${word}"` });

const toBand = (nominal: number, halfWidth: number): Toleranced => ({
  nominal,
  min: nominal - halfWidth,
  max: nominal + halfWidth,
});

interface RawBand {
  nominal: Raw;
  tolerance?: Raw | undefined;
  min?: Raw | undefined;
  max?: Raw | undefined;
}

const readBand = (raw: RawBand, dimension: Dimension, wanted: Qualifier | undefined, issue: Issue): Toleranced | null => {
  const read = (key: keyof RawBand, as: Dimension) => {
    const given = raw[key];
    return given === undefined ? undefined : readSingle(given, as, wanted, (message) => issue(message, [key]));
  };
  // A share of an absolute temperature means nothing: there the tolerance is in kelvin.
  const absolute = dimension === 'temperature';
  const nominal = read('nominal', dimension);
  const tolerance = read('tolerance', absolute ? 'temperatureInterval' : 'ratio');
  const [min, max] = [read('min', dimension), read('max', dimension)];
  if (nominal === null || nominal === undefined || tolerance === null || min === null || max === null) return null;
  if (tolerance === undefined) return { nominal, min: min ?? nominal, max: max ?? nominal };
  if (min !== undefined || max !== undefined) issue('give either a tolerance or min and max, not both');
  else if (absolute && tolerance >= 0) return toBand(nominal, tolerance);
  else if (!absolute && tolerance >= 0 && tolerance < 1) return toBand(nominal, nominal * tolerance);
  else issue(absolute ? 'the tolerance is below 0 K' : 'the tolerance is outside 0 % to 99.9 %', ['tolerance']);
  return null;
};

const readText = (text: string, dimension: Dimension, wanted: Qualifier | undefined, issue: Issue): Toleranced | null => {
  const parsed = parseTolerancedText(text, dimension);
  if (parsed.ok) return refuseQualifier(parsed.qualifier, dimension, wanted, issue) ? null : toBand(parsed.value, parsed.halfWidth);
  issue(parsed.message);
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
    tolerance: rawQuantity(dimension === 'temperature' ? 'temperatureInterval' : 'ratio').optional(),
    min: raw.optional(),
    max: raw.optional(),
  });
  return z
    .union([z.number(), z.string().max(64), object], {
      error: ({ input }) => `${missingOr(input)}write a value such as "${DIMENSIONS[dimension].example}", or an object with nominal and either tolerance, or min and max`,
    })
    .transform((given, context): Toleranced => {
      const issue = issueOn(context);
      let band: Toleranced | null;
      if (typeof given === 'number') band = toBand(given, 0);
      else if (typeof given === 'string') band = readText(given, dimension, range.qualifier, issue);
      else band = readBand(given, dimension, range.qualifier, issue);
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
