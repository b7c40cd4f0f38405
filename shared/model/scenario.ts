import { z } from 'zod';

import { bulkSchema } from './bulk';
import { checkIdSchema } from './check-id';
import { elementSchema } from './limiter';
import { faultSchema, loadSchema } from './load';
import { fuseSchema } from './protection';
import { quantity, toleranced } from './quantity';
import { rectifierSchema } from './rectifier';
import { sourceSchema } from './source';

/** What the person asks of the design; each absent limit leaves its check "not assessed". */
export const limitsSchema = z.strictObject({
  peakCurrent: quantity('current', { min: 0.01, max: 100e3, qualifier: 'peak', describe: 'Highest inrush current allowed, A peak' }).optional(),
  limiterLoss: quantity('power', { min: 1e-3, max: 10e3, describe: 'Highest steady loss allowed in the limiter' }).optional(),
  timeToTrip: quantity('time', { min: 1e-3, max: 3600, describe: 'Time allowed for a PTC to trip on the fault' }).optional(),
  voltageDrop: quantity('voltage', { min: 1e-3, max: 100, describe: 'Highest drop allowed over a PTC in operation' }).optional(),
  steadyCurrent: quantity('current', { min: 1e-3, max: 1000, qualifier: 'rms', describe: 'Highest operating current that a PTC must hold, A rms' }).optional(),
});
export type Limits = z.output<typeof limitsSchema>;

const setAsideSchema = z.strictObject({
  check: checkIdSchema,
  reason: z.string().trim().min(3, 'say why, and which document covers it').max(500),
});

/** A whole scenario: the power-up path, the conditions and the limits. The contract of file, API and engine. */
export const scenarioSchema = z
  .strictObject({
    name: z.string().trim().min(1).max(120),
    notes: z.string().max(4000).default(''),
    source: sourceSchema,
    fuse: fuseSchema.optional(),
    limiter: z.array(elementSchema).max(2).default([]),
    rectifier: rectifierSchema,
    bulk: bulkSchema,
    load: loadSchema,
    fault: faultSchema.optional(),
    ambient: toleranced('temperature', { min: 193.15, max: 423.15, describe: 'Ambient at the part, cabinet rise included' }),
    duration: quantity('time', { min: 0.02, max: 3600, describe: 'How long to follow the power-up' }).default(600),
    limits: limitsSchema.prefault({}),
    cautionBelow: quantity('ratio', { min: 0, max: 0.5, describe: 'Margin below which a passed check is a caution' }).default(0.1),
    setAside: z.array(setAsideSchema).max(27).default([]),
  })
  .superRefine((scenario, context) => {
    const issue = (path: (string | number)[], message: string) => context.addIssue({ code: 'custom', path, message });
    if (scenario.source.kind === 'ac' && scenario.rectifier.kind === 'none')
      issue(['rectifier', 'kind'], 'an AC source needs a bridge ahead of the bulk capacitor');
    if (scenario.fault && scenario.fault.at >= scenario.duration) issue(['fault', 'at'], 'must lie before the end of the run');
    scenario.source.programme.forEach((step, index) => {
      if (step.at >= scenario.duration) issue(['source', 'programme', index, 'at'], 'must lie before the end of the run');
    });
    scenario.limiter.forEach(({ part }, index) => {
      const hottest = part.ratings.maximumTemperature;
      if (hottest !== undefined && hottest <= scenario.ambient.max)
        issue(['limiter', index, 'part', 'ratings', 'maximumTemperature'], 'must be above the highest ambient');
    });
  });
export type Scenario = z.output<typeof scenarioSchema>;
export type ScenarioInput = z.input<typeof scenarioSchema>;
