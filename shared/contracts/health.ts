import { z } from 'zod';

/** The server answers this while it can serve; without its database it answers the problem `database-unavailable`. */
export const healthSchema = z.object({ status: z.literal('ok'), database: z.literal('reachable') });
export type Health = z.output<typeof healthSchema>;
