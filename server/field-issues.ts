import type { z } from 'zod';

import { plainWords } from '../shared/model/plain-words';

export interface FieldIssue {
  /** Such as bulk.capacitance; empty for the whole. */
  path: string;
  message: string;
}

export type ReadFields<Value> = { ok: true; value: Value } | { ok: false; issues: FieldIssue[] };

/** As many as a person can work through; a hostile body could raise thousands. */
const MOST_ISSUES = 50;

const fieldOf = (path: readonly PropertyKey[]) => path.map(String).join('.');
const depthOf = (issues: readonly FieldIssue[]) => Math.max(...issues.map(({ path }) => path.split('.').length));

/** Of a union that failed in every branch, the branch that came furthest tells the person most. */
const flatten = (issue: z.core.$ZodIssue, above: readonly PropertyKey[]): FieldIssue[] => {
  const path = [...above, ...issue.path];
  if (issue.code === 'unrecognized_keys') return issue.keys.map((key) => ({ path: fieldOf([...path, key]), message: 'is not a field here' }));
  if (issue.code === 'invalid_union' && issue.errors.length > 0) {
    const branches = issue.errors.map((branch) => branch.flatMap((inner) => flatten(inner, path)));
    const deepest = branches.reduce((best, branch) => (depthOf(branch) > depthOf(best) ? branch : best));
    if (depthOf(deepest) > path.length) return deepest;
  }
  return [{ path: fieldOf(path), message: issue.message }];
};

/** Reads what came from outside; every wrong field is named in plain words. */
export const readFields = <Schema extends z.ZodType>(schema: Schema, given: unknown): ReadFields<z.output<Schema>> => {
  const read = schema.safeParse(given, { error: plainWords });
  if (read.success) return { ok: true, value: read.data };
  const issues = read.error.issues.flatMap((issue) => flatten(issue, []));
  return { ok: false, issues: issues.slice(0, MOST_ISSUES) };
};
