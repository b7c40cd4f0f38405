import { z } from 'zod';

import { quantity } from './quantity';

export const fuseSchema = z
  .strictObject({
    ratedCurrent: quantity('current', { min: 0.01, max: 1000, qualifier: 'rms', describe: 'Rated current, A rms' }),
    preArcing: z
      .array(
        z.strictObject({
          time: quantity('time', { min: 1e-5, max: 1e4, describe: 'Pre-arcing time' }),
          i2t: quantity('i2t', { min: 1e-6, max: 1e9, describe: 'Minimum pre-arcing I²t at that time' }),
        }),
      )
      .max(24)
      .default([])
      .describe('Minimum (not typical) pre-arcing curve; a single figure is one point'),
    pulseFactor: quantity('ratio', { min: 0.01, max: 1, describe: 'Share of the pre-arcing I²t allowed for the stated number of starts' }).optional(),
    deratedCurrent: quantity('current', { min: 0.01, max: 1000, qualifier: 'rms', describe: 'Rating at the highest ambient, A rms' }).optional(),
    breakingCapacity: quantity('current', { min: 1, max: 300e3, qualifier: 'rms', describe: 'Breaking capacity, A rms' }).optional(),
    resistance: quantity('resistance', { min: 0, max: 100, describe: 'Cold resistance' }).default(0),
  })
  .superRefine((fuse, context) => {
    fuse.preArcing.forEach((point, index) => {
      const previous = fuse.preArcing[index - 1];
      if (previous && point.time <= previous.time)
        context.addIssue({ code: 'custom', path: ['preArcing', index, 'time'], message: 'times must rise along the curve' });
    });
  });
export type Fuse = z.output<typeof fuseSchema>;
