import { z } from 'zod';

import { checkSchema } from '../model/check';
import { verdictSchema } from '../model/result';
import { scenarioSchema } from '../model/scenario';
import { searchText } from './text';

/** The blocks of the path in order, for the glyph in a list. */
export const pathGlyphSchema = z.object({
  source: z.enum(['ac', 'dc']),
  fuse: z.boolean(),
  elements: z.array(z.object({ kind: z.enum(['ntc', 'polymer-ptc', 'resistor']), bypass: z.boolean() })),
  rectifier: z.enum(['bridge', 'none']),
  load: z.enum(['constant-power', 'resistance', 'none']),
});
export type PathGlyph = z.output<typeof pathGlyphSchema>;

export const scenarioSummarySchema = z.object({
  id: z.uuid(),
  name: z.string(),
  version: z.number().int().describe('Rises with every save; send it back when saving'),
  path: pathGlyphSchema,
  keyFigures: z.string().describe('One line, such as 230 V, NTC 10 Ω, bypass 300 ms'),
  verdict: verdictSchema.nullable().describe('Null until the saved draft has been computed'),
  closest: checkSchema.nullable().describe('The check that governs the verdict'),
  updatedAt: z.iso.datetime(),
  updatedBy: z.string(),
});
export type ScenarioSummary = z.output<typeof scenarioSummarySchema>;

export const scenarioListSchema = z.object({
  scenarios: z.array(scenarioSummarySchema),
  next: z.string().nullable().describe('Cursor of the next page'),
});
export const scenarioListQuerySchema = z.strictObject({
  after: z.string().max(200).optional(),
  search: searchText.optional(),
  limit: z.coerce.number().int().min(1).max(200).default(50),
});

export const scenarioRecordSchema = scenarioSummarySchema.extend({ scenario: scenarioSchema, mayEdit: z.boolean() });
export type ScenarioRecord = z.output<typeof scenarioRecordSchema>;

/** `id` is chosen by the client, so that a repeated request makes one scenario, not two. */
export const createScenarioSchema = z.strictObject({ id: z.uuid().optional(), scenario: scenarioSchema });
export const saveScenarioSchema = z.strictObject({ version: z.number().int().min(1), scenario: scenarioSchema });
