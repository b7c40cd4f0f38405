import type { z } from 'zod';

const KIND_WORDS: Readonly<Record<string, string>> = {
  string: 'text',
  number: 'a number',
  int: 'a whole number',
  boolean: 'true or false',
  array: 'a list',
  object: 'an object with fields',
};

const COUNTED: Readonly<Record<string, string>> = { string: 'characters', array: 'entries' };

const limitWords = (side: 'least' | 'most', origin: string, limit: number | bigint) => {
  const counted = COUNTED[origin];
  if (counted && side === 'least' && Number(limit) === 1) return 'must not be empty';
  return counted ? `must have at ${side} ${limit} ${counted}` : `must be at ${side} ${limit}`;
};

const oneOf = (values: readonly unknown[]) => `must be ${values.length > 1 ? 'one of ' : ''}${values.map((value) => JSON.stringify(value)).join(', ')}`;

/** What the schema library finds wrong, in the product's words; its own wording where none is better. */
export const plainWords: z.core.$ZodErrorMap = (issue) => {
  if (issue.input === undefined && issue.code !== 'unrecognized_keys') return 'is missing';
  switch (issue.code) {
    case 'invalid_type':
      return `must be ${KIND_WORDS[issue.expected] ?? issue.expected}`;
    case 'invalid_value':
      return oneOf(issue.values);
    case 'invalid_union':
      return Array.isArray(issue.options) ? oneOf(issue.options) : undefined;
    case 'too_small':
      return limitWords('least', issue.origin, issue.minimum);
    case 'too_big':
      return limitWords('most', issue.origin, issue.maximum);
    case 'invalid_format':
      return `is not a valid ${issue.format}`;
    default:
      return undefined;
  }
};
