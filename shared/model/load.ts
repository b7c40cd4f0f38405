import { z } from 'zod';

import { quantity } from './quantity';

export const loadSchema = z.discriminatedUnion('kind', [
  z
    .strictObject({
      kind: z.literal('constant-power'),
      power: quantity('power', { min: 1e-3, max: 100e3, describe: 'Power drawn from the bus' }),
      startVoltage: quantity('voltage', { min: 0.1, max: 1500, describe: 'Bus voltage at which the converter starts' }),
      stopVoltage: quantity('voltage', { min: 0.05, max: 1500, describe: 'Bus voltage at which it stops; 70 % of the start voltage where absent' }).optional(),
      startDelay: quantity('time', { min: 0, max: 60, describe: 'Delay after the start voltage, counted again after every stop' }).default(0),
      rampTime: quantity('time', { min: 0, max: 60, describe: 'Soft-start ramp' }).default(0),
    })
    .superRefine((load, context) => {
      if (load.stopVoltage !== undefined && load.stopVoltage >= load.startVoltage)
        context.addIssue({ code: 'custom', path: ['stopVoltage'], message: 'must be below the start voltage' });
    }),
  z.strictObject({
    kind: z.literal('resistance'),
    resistance: quantity('resistance', { min: 1e-3, max: 1e9, describe: 'Load resistance' }),
  }),
  z.strictObject({ kind: z.literal('none') }),
]);
export type Load = z.output<typeof loadSchema>;

export const faultSchema = z.strictObject({
  kind: z.literal('resistance'),
  at: quantity('time', { min: 0, max: 86_400, describe: 'Time of the fault after switch-on' }),
  resistance: quantity('resistance', { min: 1e-4, max: 1e6, describe: 'Fault resistance across the bus' }),
});
export type Fault = z.output<typeof faultSchema>;
