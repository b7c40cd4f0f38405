import { z } from 'zod';

import { quantity, toleranced } from './quantity';

/** Impedance ahead of the equipment, entered either way; there is no default. */
export const impedanceSchema = z.union([
  z.strictObject({
    resistance: toleranced('resistance', { min: 0, max: 10e3, describe: 'Source resistance' }),
    inductance: toleranced('inductance', { min: 0, max: 10e-3, describe: 'Source inductance' }),
  }),
  z.strictObject({
    prospectiveCurrent: toleranced('current', { min: 1, max: 200e3, describe: 'Prospective short-circuit current, A rms' }),
    reactanceRatio: quantity('count', { min: 0, max: 50, describe: 'X/R of the supply' }),
  }),
]);

const programmeSchema = z
  .array(
    z.strictObject({
      at: quantity('time', { min: 0, max: 86_400, describe: 'Time after the first switch-on' }),
      switch: z.enum(['off', 'on']),
    }),
  )
  .max(20)
  .default([])
  .superRefine((steps, context) => {
    steps.forEach((step, index) => {
      const previous = steps[index - 1];
      const expected = index % 2 === 0 ? 'off' : 'on';
      if (step.switch !== expected)
        context.addIssue({ code: 'custom', path: [index, 'switch'], message: `must be "${expected}": the supply is on at 0 s and each step changes it` });
      if (step.at <= (previous?.at ?? 0))
        context.addIssue({ code: 'custom', path: [index, 'at'], message: 'must be later than the step before it' });
    });
  });

const common = {
  impedance: impedanceSchema,
  programme: programmeSchema.describe('Supply off and on again after the first switch-on'),
};

export const acSourceSchema = z.strictObject({
  kind: z.literal('ac'),
  voltage: toleranced('voltage', { min: 1, max: 1000, describe: 'Line voltage, V rms, with the supply tolerance' }),
  frequency: z
    .union([
      quantity('frequency', { min: 10, max: 1000, describe: 'Line frequency' }),
      z.array(quantity('frequency', { min: 10, max: 1000, describe: 'Line frequency' })).min(1).max(2),
    ])
    .transform((value) => (Array.isArray(value) ? value : [value]))
    .describe('One frequency, or both that the equipment is allowed on'),
  phase: z
    .union([z.literal('worst'), quantity('angle', { min: 0, max: 360, describe: 'Switch-on angle in degrees' })])
    .default('worst'),
  ...common,
});

export const dcSourceSchema = z.strictObject({
  kind: z.literal('dc'),
  voltage: toleranced('voltage', { min: 0.5, max: 1500, describe: 'Supply voltage' }),
  ...common,
});

export const sourceSchema = z.discriminatedUnion('kind', [acSourceSchema, dcSourceSchema]);
export type Source = z.output<typeof sourceSchema>;
export type AcSource = z.output<typeof acSourceSchema>;
