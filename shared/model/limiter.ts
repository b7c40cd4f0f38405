import { z } from 'zod';

import { partSchema } from './part';
import { quantity } from './quantity';

/** A contact in parallel with one limiter element. */
export const bypassSchema = z.strictObject({
  closes: z.discriminatedUnion('when', [
    z.strictObject({ when: z.literal('time'), at: quantity('time', { min: 1e-4, max: 3600, describe: 'Time after each switch-on' }) }),
    z.strictObject({ when: z.literal('bus-voltage'), above: quantity('voltage', { min: 0.1, max: 1500, describe: 'Bus voltage at which it closes' }) }),
  ]),
  releaseTime: quantity('time', { min: 0, max: 60, describe: 'Time from power-off until it opens' }),
  contactResistance: quantity('resistance', { min: 1e-5, max: 10, describe: 'Contact resistance' }),
  makingCurrent: quantity('current', { min: 0.1, max: 10e3, qualifier: 'peak', describe: 'Making current rating, A peak' }).optional(),
  behaviour: z
    .enum(['works', 'never-closes', 'welded'])
    .default('works')
    .describe('What the contact does; its two failures are also checked when it works'),
});
export type Bypass = z.output<typeof bypassSchema>;

export const elementSchema = z.strictObject({ part: partSchema, bypass: bypassSchema.optional() });
export type Element = z.output<typeof elementSchema>;
