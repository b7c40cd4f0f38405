import { z } from 'zod';

import { ERROR_CODES } from '../error-codes';

/** RFC 9457 problem details, as `application/problem+json`. */
export const problemSchema = z.object({
  type: z.string().describe('URI reference of the kind of problem'),
  title: z.string(),
  status: z.number().int(),
  detail: z.string().optional(),
  instance: z.string().describe('Id of this one occurrence, also in the server log'),
  code: z.enum(ERROR_CODES),
  issues: z.array(z.object({ path: z.string().describe('Field, such as bulk.capacitance'), message: z.string() })).optional(),
  conflict: z.unknown().optional().describe('With version-conflict: the record as it is now'),
});
export type Problem = z.output<typeof problemSchema>;
