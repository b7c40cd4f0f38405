import { z } from 'zod';

import { numberUnit } from '../quantity/dimension';
import { FIGURES, type FigureId } from './figure-list';

export { FIGURES, type FigureId, type Figures } from './figure-list';

const entries = Object.entries(FIGURES).map(([id, { label, dimension }]) => [
  id,
  z.number().nullable().meta({ description: label, unit: numberUnit(dimension) }),
]);
export const figuresSchema = z.object(Object.fromEntries(entries) as Record<FigureId, z.ZodNullable<z.ZodNumber>>);

/** Figures of one limiter element. */
export const elementFiguresSchema = z.object({
  name: z.string(),
  startResistance: z.number().meta({ unit: 'Ω' }),
  energy: z.number().meta({ unit: 'J', description: 'Absorbed over the run' }),
  firstPulseEnergy: z.number().meta({ unit: 'J' }),
  chargeEnergy: z.number().nullable().meta({ unit: 'J' }),
  peakTemperature: z.number().meta({ unit: 'K' }),
  chargePeakTemperature: z.number().nullable().meta({ unit: 'K', description: 'Highest until the end of charging' }),
  finalTemperature: z.number().meta({ unit: 'K' }),
  finalResistance: z.number().meta({ unit: 'Ω' }),
  steadyRmsCurrent: z.number().nullable().meta({ unit: 'A', description: 'Through the body, contact apart' }),
  trippedAt: z.number().nullable().meta({ unit: 's' }),
});
export type ElementFigures = z.output<typeof elementFiguresSchema>;
