import { z } from 'zod';

import { quantity } from './quantity';

export const rectifierSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('bridge'),
    forwardVoltage: quantity('voltage', { min: 0, max: 5, describe: 'Threshold voltage of one diode' }),
    slopeResistance: quantity('resistance', { min: 0, max: 10, describe: 'Slope resistance of one diode' }),
    surge: z
      .strictObject({
        current: quantity('current', { min: 0.1, max: 100e3, qualifier: 'peak', describe: 'Surge rating of one diode, A peak, half sine' }),
        pulseWidth: quantity('time', { min: 1e-4, max: 0.02, describe: 'Width of the half sine that the surge rating holds for' }),
        i2t: quantity('i2t', { min: 1e-4, max: 1e9, describe: 'I²t rating of one diode' }).optional(),
      })
      .optional(),
  }),
  z.strictObject({ kind: z.literal('none') }),
]);
export type Rectifier = z.output<typeof rectifierSchema>;
