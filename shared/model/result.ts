import { z } from 'zod';

import { checkSchema, STATUSES } from './check';
import { cornerSchema } from './corner';
import { elementFiguresSchema, figuresSchema } from './figure';

const numbers = z.array(z.number());

export const EVENT_KINDS = [
  'switch-on', 'switch-off', 'charged', 'load-starts', 'load-stops', 'contact-closes', 'contact-opens',
  'fault-begins', 'trips', 'resets',
] as const;
export const eventSchema = z.object({
  kind: z.enum(EVENT_KINDS),
  at: z.number().meta({ unit: 's' }),
  element: z.number().int().nullable(),
});
export type RunEvent = z.output<typeof eventSchema>;

/** Traces up to `foldAt` are instantaneous, after it one point is a half period (DC: an instant). SI. */
export const tracesSchema = z.object({
  foldAt: z.number(),
  waveform: z.object({
    time: numbers,
    current: numbers,
    bus: numbers,
    temperature: z.array(numbers).describe('One series for each limiter element'),
    resistance: z.array(numbers),
    energy: z.array(numbers),
    i2t: numbers,
  }),
  soak: z.object({
    time: numbers,
    peakCurrent: numbers,
    rmsCurrent: numbers,
    bus: numbers.describe('Lowest in the half period'),
    temperature: z.array(numbers),
    resistance: z.array(numbers),
    energy: z.array(numbers),
    i2t: numbers,
  }),
});
export type Traces = z.output<typeof tracesSchema>;

const bandSchema = z.object({ low: numbers, high: numbers });
const bandsSchema = z.object({ time: numbers, current: bandSchema, temperature: z.array(bandSchema), energy: z.array(bandSchema) });
/** Lowest and highest of all corners at each time. */
export const envelopeSchema = z.object({ waveform: bandsSchema, soak: bandsSchema });
export type Envelope = z.output<typeof envelopeSchema>;

export const auditSchema = z.object({
  clean: z.boolean(),
  worstResidual: z.number().describe('Largest of the relative residuals below'),
  elementEnergy: numbers.describe('Energy balance of each element, relative to its own energy'),
  sourceEnergy: z.number().describe('Energy balance of the source, relative to its energy'),
  pulses: z.object({ expected: z.number().int(), found: z.number().int() }),
  soak: z.object({ temperature: z.number().meta({ unit: 'K' }), rmsCurrent: z.number() }).nullable().describe('Soak against a stretch of full waveform at its end; null where there was no soak'),
  notes: z.array(z.string()),
});
export type Audit = z.output<typeof auditSchema>;

/** Why a run ended before its time. */
export const stoppedSchema = z.object({
  reason: z.enum(['step-too-small', 'step-budget', 'outside-law']),
  at: z.number().meta({ unit: 's' }),
  place: z.string().describe('Path of the field to look at, such as limiter.0.part.thermal'),
  advice: z.string(),
});
export type Stopped = z.output<typeof stoppedSchema>;

export const runSchema = z.object({
  stopped: stoppedSchema.nullable(),
  figures: figuresSchema,
  elements: z.array(elementFiguresSchema),
  events: z.array(eventSchema),
  traces: tracesSchema,
  audit: auditSchema,
  remarks: z.array(z.string()).describe('Assumptions, reductions and extrapolations that entered'),
});
export type Run = z.output<typeof runSchema>;

export const verdictSchema = z.object({
  status: z.enum(STATUSES),
  counts: z.object({ fail: z.number(), 'not-assessed': z.number(), caution: z.number(), pass: z.number(), 'set-aside': z.number() }),
});
export type Verdict = z.output<typeof verdictSchema>;

export const restartCurveSchema = z.object({
  offTime: numbers,
  peakCurrent: numbers,
  worstOffTime: z.number(),
  shortDipsWithin: z.number().nullable().describe('Every shorter dip is within rating, s; null without a limit'),
  withinAfter: z.number().nullable().describe('Every longer time off is within rating, s'),
});
export type RestartCurve = z.output<typeof restartCurveSchema>;

/** Everything computed for one scenario: nominal run, envelope, checks in the order of the verdict. */
export const assessmentSchema = z.object({
  engineVersion: z.string(),
  verdict: verdictSchema,
  checks: z.array(checkSchema),
  run: runSchema,
  envelope: envelopeSchema.nullable().describe('Null where nothing has a range'),
  corners: z.array(cornerSchema),
  restart: restartCurveSchema.nullable(),
});
export type Assessment = z.output<typeof assessmentSchema>;
