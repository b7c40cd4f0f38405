import type { z } from 'zod';

export interface InputIssue {
  /** Dotted path of the field, such as `bulk.capacitance`; empty for the whole input. */
  path: string;
  message: string;
}

/** What is wrong with an input, a line for each field, for the command line and the API alike. */
export const inputIssues = (error: z.ZodError): InputIssue[] =>
  error.issues.flatMap((issue) => {
    const path = issue.path.map(String);
    if (issue.code !== 'unrecognized_keys') return [{ path: path.join('.'), message: issue.message }];
    return issue.keys.map((key) => ({ path: [...path, key].join('.'), message: 'is not a field here' }));
  });
