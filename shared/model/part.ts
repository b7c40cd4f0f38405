import { z } from 'zod';

import { quantity, toleranced } from './quantity';

const bodyTemperature = (describe: string) => quantity('temperature', { min: 333.15, max: 873.15, describe });
const lawTemperature = (describe: string) => quantity('temperature', { min: 193.15, max: 773.15, describe });
const bodyResistance = (describe: string) => toleranced('resistance', { min: 1e-4, max: 1e6, describe });

/** Resistance at a temperature, for a maker's R–T table. */
const tableSchema = z
  .array(
    z.strictObject({
      temperature: lawTemperature('Body temperature'),
      resistance: quantity('resistance', { min: 1e-5, max: 1e9, describe: 'Zero-power resistance' }),
    }),
  )
  .min(3)
  .max(400);

const fallingTable = tableSchema.superRefine((points, context) => {
  points.forEach((point, index) => {
    const previous = points[index - 1];
    if (!previous) return;
    if (point.temperature <= previous.temperature)
      context.addIssue({ code: 'custom', path: [index, 'temperature'], message: 'temperatures must rise down the table' });
    if (point.resistance >= previous.resistance)
      context.addIssue({ code: 'custom', path: [index, 'resistance'], message: 'the resistance of an NTC must fall down the table' });
  });
});

const resistanceTolerance = quantity('ratio', { min: 0, max: 0.5, describe: 'Tolerance of the resistance' }).default(0);

/** Whether A + B ln R + C (ln R)³ rises with R and passes 1/T of 150 °C and −40 °C between 10 µΩ and 1 GΩ. */
const fallsOverItsRange = ({ a, b, c }: { a: number; b: number; c: number }): boolean => {
  const inverse = (logarithm: number) => a + b * logarithm + c * logarithm ** 3;
  const turn = c < 0 ? Math.sqrt(Math.max(b, 0) / (-3 * c)) : Infinity;
  const [lowest, highest] = [Math.max(-turn, Math.log(1e-5)), Math.min(turn, Math.log(1e9))];
  return b > 0 && inverse(lowest) < 1 / 423.15 && inverse(highest) > 1 / 233.15;
};

export const ntcLawSchema = z.discriminatedUnion('law', [
  z.strictObject({
    law: z.literal('b-value'),
    r25: bodyResistance('R25, zero-power resistance at 25 °C'),
    b: toleranced('temperatureInterval', { min: 500, max: 8000, describe: 'B-value (25/85)' }),
  }),
  z
    .strictObject({
      law: z.literal('steinhart-hart'),
      a: z.number().min(-0.1).max(0.1).describe('A of 1/T = A + B ln R + C (ln R)³, 1/K, R in Ω'),
      b: z.number().min(-0.1).max(0.1).describe('B, 1/K'),
      c: z.number().min(-0.01).max(0.01).describe('C, 1/K'),
      tolerance: resistanceTolerance,
    })
    .superRefine((law, context) => {
      if (!fallsOverItsRange(law))
        context.addIssue({ code: 'custom', path: ['b'], message: 'with these coefficients the resistance does not fall from -40 °C to 150 °C; check their order and units' });
    }),
  z.strictObject({ law: z.literal('table'), points: fallingTable, tolerance: resistanceTolerance }),
]);

export const polymerPtcLawSchema = z
  .strictObject({
    law: z.literal('sigmoid'),
    low: bodyResistance('Resistance far below the knee, with the spread from R_min to R_1max'),
    high: quantity('resistance', { min: 1, max: 1e12, describe: 'Resistance far above the knee' }),
    midpoint: lawTemperature('Temperature at the middle of the rise'),
    width: quantity('temperatureInterval', { min: 0.2, max: 50, describe: 'Width of the rise' }),
  })
  .superRefine((law, context) => {
    if (law.high <= 10 * law.low.max)
      context.addIssue({ code: 'custom', path: ['high'], message: 'must be more than ten times the low resistance' });
  });

export const resistorLawSchema = z.strictObject({
  law: z.literal('fixed'),
  resistance: bodyResistance('Resistance'),
});

/** Dissipation factor with exactly one of thermal time constant and heat capacity (C_th = δ·τ). */
export const thermalSchema = z
  .strictObject({
    dissipation: quantity('dissipation', { min: 1e-5, max: 100, describe: 'Dissipation factor δ' }),
    timeConstant: quantity('time', { min: 0.01, max: 1e4, describe: 'Thermal time constant τ' }).optional(),
    heatCapacity: quantity('heatCapacity', { min: 1e-5, max: 1e4, describe: 'Heat capacity C_th' }).optional(),
  })
  .transform((given, context): Thermal => {
    const { dissipation, timeConstant, heatCapacity } = given;
    if (timeConstant !== undefined && heatCapacity === undefined) return { dissipation, timeConstant };
    if (heatCapacity !== undefined && timeConstant === undefined) return { dissipation, heatCapacity };
    context.addIssue({ code: 'custom', message: 'give either timeConstant or heatCapacity' });
    return z.NEVER;
  });
export type Thermal = { dissipation: number; timeConstant: number } | { dissipation: number; heatCapacity: number };

export const energyBasis = z.enum(['absorbed', 'half-cv2-rms', 'half-cv2-peak', 'unknown']);

export const ratingsSchema = z
  .strictObject({
    maximumTemperature: bodyTemperature('Highest body temperature').optional(),
    steadyCurrent: z
      .strictObject({
        current: quantity('current', { min: 1e-3, max: 1000, qualifier: 'rms', describe: 'Highest steady current, A rms' }),
        ambient: quantity('temperature', { min: 233.15, max: 473.15, describe: 'Highest ambient at which it holds' }),
        derating: z
          .array(
            z.strictObject({
              ambient: quantity('temperature', { min: 213.15, max: 573.15, describe: 'Ambient' }),
              share: quantity('ratio', { min: 0, max: 2, describe: 'Share of the rated current' }),
            }),
          )
          .max(24)
          .superRefine((points, context) => {
            points.forEach((point, index) => {
              const previous = points[index - 1];
              if (previous && point.ambient <= previous.ambient)
                context.addIssue({ code: 'custom', path: [index, 'ambient'], message: 'ambients must rise along the derating curve' });
            });
          })
          .optional(),
      })
      .optional(),
    energy: z
      .strictObject({
        energy: quantity('energy', { min: 1e-3, max: 1e6, describe: 'Highest energy of one pulse' }),
        basis: energyBasis,
        startTemperature: quantity('temperature', { min: 233.15, max: 473.15, describe: 'Body temperature before the pulse' }).default(298.15),
        pulses: quantity('count', { min: 1, max: 1e7, describe: 'Number of pulses that the rating holds for' }).optional(),
      })
      .optional(),
    capacitance: z
      .strictObject({
        capacitance: quantity('capacitance', { min: 1e-8, max: 10, describe: 'Highest capacitance' }),
        voltage: quantity('voltage', { min: 1, max: 1500, describe: 'Voltage at which it is stated' }),
        voltageIs: z.enum(['rms', 'peak']),
      })
      .optional(),
    maximumVoltage: quantity('voltage', { min: 1, max: 2000, describe: 'V_max of a PTC' }).optional(),
    maximumCurrent: quantity('current', { min: 0.01, max: 10e3, describe: 'I_max, highest fault current of a PTC' }).optional(),
  })
  .superRefine(({ maximumTemperature, steadyCurrent, energy }, context) => {
    if (maximumTemperature === undefined) return;
    const message = 'must be below the highest body temperature';
    if (steadyCurrent && steadyCurrent.ambient >= maximumTemperature)
      context.addIssue({ code: 'custom', path: ['steadyCurrent', 'ambient'], message });
    if (energy && energy.startTemperature >= maximumTemperature)
      context.addIssue({ code: 'custom', path: ['energy', 'startTemperature'], message });
  });

const common = {
  name: z.string().trim().min(1).max(80),
  maker: z.string().trim().max(80).default(''),
  libraryId: z.uuid().optional().describe('The library part that this was taken from'),
  thermal: thermalSchema,
  ratings: ratingsSchema.prefault({}),
};

export const partSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('ntc'), law: ntcLawSchema, ...common }),
  z.strictObject({ kind: z.literal('polymer-ptc'), law: polymerPtcLawSchema, ...common }),
  z.strictObject({ kind: z.literal('resistor'), law: resistorLawSchema, ...common }),
]);
export type Part = z.output<typeof partSchema>;
export type PartInput = z.input<typeof partSchema>;
export type PartKind = Part['kind'];
export type NtcLaw = z.output<typeof ntcLawSchema>;
export type PolymerPtcLaw = z.output<typeof polymerPtcLawSchema>;
export type Ratings = z.output<typeof ratingsSchema>;
