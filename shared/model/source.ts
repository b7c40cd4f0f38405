import { z } from 'zod';

import { quantity, quantityOr, toleranced, type Toleranced } from './quantity';

/** Impedance ahead of the equipment, entered either way; there is no default. */
export type Impedance =
  | { resistance: Toleranced; inductance: Toleranced }
  | { prospectiveCurrent: Toleranced; reactanceRatio: number };

/** One flat object, so that a wrong field is named; exactly one of the two pairs must be whole. */
export const impedanceSchema = z
  .strictObject({
    resistance: toleranced('resistance', { min: 0, max: 10e3, describe: 'Source resistance' }).optional(),
    inductance: toleranced('inductance', { min: 0, max: 10e-3, describe: 'Source inductance' }).optional(),
    prospectiveCurrent: toleranced('current', { min: 1, max: 200e3, qualifier: 'rms', describe: 'Prospective short-circuit current, A rms' }).optional(),
    reactanceRatio: quantity('count', { min: 0, max: 50, describe: 'X/R of the supply' }).optional(),
  })
  .transform((given, context): Impedance => {
    const { resistance, inductance, prospectiveCurrent, reactanceRatio } = given;
    const byElements = resistance !== undefined && inductance !== undefined;
    const byCurrent = prospectiveCurrent !== undefined && reactanceRatio !== undefined;
    const count = Object.values(given).filter((value) => value !== undefined).length;
    if (count === 2 && byElements) return { resistance, inductance };
    if (count === 2 && byCurrent) return { prospectiveCurrent, reactanceRatio };
    context.addIssue({ code: 'custom', message: 'give either resistance and inductance, or prospectiveCurrent and reactanceRatio' });
    return z.NEVER;
  });

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
  voltage: toleranced('voltage', { min: 1, max: 1000, qualifier: 'rms', describe: 'Line voltage, V rms, with the supply tolerance' }),
  frequencies: z
    .array(quantity('frequency', { min: 10, max: 1000, describe: 'Line frequency' }))
    .min(1)
    .max(2)
    .describe('One frequency, or both that the equipment is allowed on'),
  phase: quantityOr('worst', 'angle', { min: 0, max: 360, describe: 'Switch-on angle in degrees' }).default('worst'),
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
