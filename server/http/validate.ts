import type { z } from 'zod';

import { readFields } from '../field-issues';
import { ProblemError } from './problem-error';

/** Reads what a client sent, or answers 400 with every wrong field named. */
export const validate = <Schema extends z.ZodType>(schema: Schema, given: unknown): z.output<Schema> => {
  const read = readFields(schema, given);
  if (read.ok) return read.value;
  const [first] = read.issues;
  throw new ProblemError('invalid-input', first && `${first.path || 'The body'}: ${first.message}`, { issues: read.issues });
};
