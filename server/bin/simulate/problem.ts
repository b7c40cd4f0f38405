import type { FieldIssue } from '../../field-issues';

/** Why the command could not begin: wrong options, an unreadable file or a field outside its range. */
export class InputProblem extends Error {
  constructor(
    readonly title: string,
    readonly issues: readonly FieldIssue[] = [],
  ) {
    super(title);
  }
}

const WHOLE = 'scenario';

/** Plain words, a line for each field, and the same as one line of JSON for a program that reads it. */
export const problemText = ({ title, issues }: InputProblem): string => {
  const named = issues.map(({ path, message }) => ({ path: path || WHOLE, message }));
  const lines = named.map(({ path, message }) => `  ${path}: ${message}`);
  return [title, ...lines, JSON.stringify({ code: 'invalid-input', title, issues: named }), ''].join('\n');
};
