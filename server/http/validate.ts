import type { z } from 'zod';

import type { Problem } from '../../shared/contracts/problem';
import { ProblemError } from './problem-error';

type FieldIssue = NonNullable<Problem['issues']>[number];
/** As many as a person can work through; a hostile body could raise thousands. */
const MOST_ISSUES = 50;

const fieldOf = (path: readonly PropertyKey[]) => path.map(String).join('.');

/** Of a union that failed in every branch, the branch that came furthest tells the person most. */
const flatten = (issue: z.core.$ZodIssue, above: readonly PropertyKey[]): FieldIssue[] => {
  const path = [...above, ...issue.path];
  if (issue.code === 'unrecognized_keys')
    return issue.keys.map((key) => ({ path: fieldOf([...path, key]), message: 'is not a field here' }));
  if (issue.code === 'invalid_union' && issue.errors.length > 0) {
    const branches = issue.errors.map((branch) => branch.flatMap((inner) => flatten(inner, path)));
    const depth = (branch: FieldIssue[]) => Math.max(...branch.map((one) => one.path.split('.').length));
    const deepest = branches.reduce((best, branch) => (depth(branch) > depth(best) ? branch : best));
    if (depth(deepest) > fieldOf(path).split('.').length) return deepest;
  }
  return [{ path: fieldOf(path), message: issue.message }];
};

export const fieldIssues = (error: z.ZodError): FieldIssue[] =>
  error.issues.flatMap((issue) => flatten(issue as z.core.$ZodIssue, [])).slice(0, MOST_ISSUES);

/** Reads what a client sent, or answers 400 with every wrong field named. */
export const validate = <Schema extends z.ZodType>(schema: Schema, given: unknown): z.output<Schema> => {
  const read = schema.safeParse(given);
  if (read.success) return read.data;
  const issues = fieldIssues(read.error);
  const first = issues[0];
  throw new ProblemError('invalid-input', first && `${first.path || 'The body'}: ${first.message}`, { issues });
};
