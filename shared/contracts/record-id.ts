import { z } from 'zod';

/** An id as it stands in an address; lower case inside, as the database writes it. */
export const recordIdSchema = z.uuid().toLowerCase();
export const idParamsSchema = z.strictObject({ id: recordIdSchema });
