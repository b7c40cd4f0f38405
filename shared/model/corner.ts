import { z } from 'zod';

export const LEVELS = ['low', 'nominal', 'high'] as const;
export type Level = (typeof LEVELS)[number];

/** What a corner can move. `elementResistance` and `elementB` move every limiter element alike. */
export const FACTORS = ['line', 'frequency', 'ambient', 'elementResistance', 'elementB', 'capacitance', 'esr', 'sourceImpedance'] as const;
export type Factor = (typeof FACTORS)[number];

/** A corner names only the factors that have a range; `value` is what the factor came to (SI), `change` its share off nominal. */
export const cornerSchema = z.object({
  factors: z.array(
    z.object({ factor: z.enum(FACTORS), level: z.enum(LEVELS), value: z.number(), change: z.number().nullable() }),
  ),
});
export type Corner = z.output<typeof cornerSchema>;
