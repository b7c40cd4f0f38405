import { z } from 'zod';

import { assessmentSchema } from '../model/result';
import { scenarioSchema } from '../model/scenario';

export const simulateSchema = z.strictObject({ scenario: scenarioSchema });
/** `milliseconds` is the computing time on the server. */
export const simulatedSchema = z.object({ assessment: assessmentSchema, milliseconds: z.number() });
export type Simulated = z.output<typeof simulatedSchema>;
