import { z } from 'zod';

/** Text that the database can hold: PostgreSQL has no place for U+0000. */
export const storableText = z.string().refine((text) => !text.includes('\0'), 'must not hold the character U+0000');

/** A piece of a name to look for. */
export const searchText = storableText.pipe(z.string().trim().max(120));
