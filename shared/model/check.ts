import { z } from 'zod';

import { checkIdSchema } from './check-id';
import { cornerSchema } from './corner';
import { DIMENSIONS, type Dimension } from '../quantity/dimension';

export const STATUSES = ['fail', 'not-assessed', 'caution', 'pass'] as const;
/** In the order of the verdict, most pressing first. */
export type Status = (typeof STATUSES)[number];

const dimensions = Object.keys(DIMENSIONS) as [Dimension, ...Dimension[]];

/** One worst-case value held against one rating. Values in SI; a current's kind is told by `kind`. */
export const checkSchema = z.object({
  id: checkIdSchema,
  element: z.number().int().nullable().describe('Index of the limiter element that it is about'),
  title: z.string(),
  status: z.enum(STATUSES),
  dimension: z.enum(dimensions),
  kind: z.enum(['rms', 'peak']).nullable(),
  sense: z.enum(['at-most', 'at-least']),
  value: z.number().nullable().describe('Worst case over corners and phase'),
  nominal: z.number().nullable().describe('The same value in the nominal case'),
  rating: z.number().nullable(),
  ratio: z.number().nullable().describe('Use of the rating, 1 at the rating, above 1 beyond it, whatever the sense'),
  nominalRatio: z.number().nullable(),
  margin: z.number().nullable().describe('1 − ratio'),
  corner: cornerSchema.nullable(),
  phase: z.number().nullable().describe('Switch-on angle in degrees'),
  offTime: z.number().nullable().describe('Time without supply before a restart, s'),
  basis: z.string().describe('Formula, standard and clause, or "common practice"'),
  remark: z.string().nullable().describe('What is missing, or why it is only a caution'),
  setAside: z.string().nullable().describe('The reason why a person set it aside'),
});
export type Check = z.output<typeof checkSchema>;
