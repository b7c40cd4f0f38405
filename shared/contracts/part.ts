import { z } from 'zod';

import { partSchema } from '../model/part';
import { searchText } from './text';

export const partSummarySchema = z.object({
  id: z.uuid(),
  revision: z.number().int(),
  approvedBy: z.string().nullable(),
  part: partSchema,
  resistance25: z.number().describe('Zero-power resistance at 25 °C by the part\'s law, nominal, Ω'),
});
export type PartSummary = z.output<typeof partSummarySchema>;

export const partListSchema = z.object({ parts: z.array(partSummarySchema), next: z.string().nullable() });
export const partListQuerySchema = z.strictObject({
  after: z.string().max(200).optional(),
  search: searchText.optional(),
  kind: z.enum(['ntc', 'polymer-ptc', 'resistor']).optional(),
  limit: z.coerce.number().int().min(1).max(200).default(100),
});

/** R against body temperature, K and Ω, with the band of the tolerances. */
export const resistanceCurveSchema = z.object({
  temperature: z.array(z.number()),
  nominal: z.array(z.number()),
  low: z.array(z.number()),
  high: z.array(z.number()),
  valid: z.object({ min: z.number(), max: z.number() }).describe('Inside which the law was given, K'),
});
export type ResistanceCurve = z.output<typeof resistanceCurveSchema>;

export const partRecordSchema = partSummarySchema.extend({
  curve: resistanceCurveSchema,
  provenance: z.array(
    z.object({ figure: z.string().describe('Path inside the part, such as law.r25'), document: z.string(), page: z.string(), condition: z.string() }),
  ),
  usedIn: z.array(z.object({ id: z.uuid(), name: z.string(), status: z.string().nullable() })),
});
export type PartRecord = z.output<typeof partRecordSchema>;
