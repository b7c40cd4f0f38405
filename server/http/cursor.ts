import { z } from 'zod';

import { ProblemError } from './problem-error';

/** Where a page ended: the value it was sorted by and the id, which makes the order total. */
export type PageKey = [string, string];

export const writeCursor = (key: PageKey): string => Buffer.from(JSON.stringify(key)).toString('base64url');

/** @param sortedBy what the first half of the key must look like */
export const readCursor = (cursor: string, sortedBy: z.ZodType<string>): PageKey => {
  try {
    return z.tuple([sortedBy, z.uuid()]).parse(JSON.parse(Buffer.from(cursor, 'base64url').toString()));
  } catch {
    throw new ProblemError('invalid-input', 'after: is not a cursor of this list', {
      issues: [{ path: 'after', message: 'is not a cursor of this list; take it from `next` of the page before' }],
    });
  }
};

/** Splits one row too many off a page and tells whether there is a next one. */
export const pageOf = <Row>(rows: Row[], limit: number, keyOf: (row: Row) => PageKey): { page: Row[]; next: string | null } => {
  const page = rows.slice(0, limit);
  const last = page[page.length - 1];
  return { page, next: rows.length > limit && last ? writeCursor(keyOf(last)) : null };
};

/** The text as a LIKE pattern that finds it anywhere. */
export const containing = (text: string): string => `%${text.replace(/[\\%_]/g, '\\$&')}%`;
