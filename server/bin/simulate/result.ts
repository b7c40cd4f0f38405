import { z } from 'zod';

import type { CheckId } from '../../../shared/model/check-id';
import { checkSchema, type Check } from '../../../shared/model/check';
import { assessmentSchema, runSchema, type Assessment } from '../../../shared/model/result';

/** What the command prints: the assessment without its traces, and whether it is within ratings. */
export const resultSchema = z.object({
  scenario: z.string().describe('Name of the scenario'),
  withinRatings: z.boolean().describe('True where the command exits with 0'),
  because: z.array(z.string()).describe('What keeps the design from being within ratings; empty where it is'),
  ...assessmentSchema.pick({ engineVersion: true, verdict: true }).shape,
  checks: z.array(checkSchema),
  ...runSchema.pick({ figures: true, elements: true, events: true, audit: true, stopped: true, remarks: true }).shape,
  ...assessmentSchema.pick({ restart: true, corners: true }).shape,
});
export type Result = z.output<typeof resultSchema>;

const reasonOf = ({ id, element, status, setAside, remark }: Check, accepted: ReadonlySet<CheckId>): string[] => {
  if (setAside !== null) return [];
  const which = element === null ? id : `${id}, element ${element}`;
  if (status === 'fail') return [`${which}: fails`];
  if (status === 'not-assessed' && !accepted.has(id)) return [`${which}: not assessed${remark ? `, ${remark}` : ''}`];
  return [];
};

/** A run that ended early or whose audit is not clean proves nothing, whatever its checks say. */
const reasonsOf = ({ checks, run }: Assessment, accepted: ReadonlySet<CheckId>): string[] => [
  ...(run.stopped ? [`the run stopped at ${run.stopped.at} s: ${run.stopped.advice}`] : []),
  ...(run.audit.clean ? [] : ['the self-audit is not clean: see audit']),
  ...checks.flatMap((check) => reasonOf(check, accepted)),
];

export const resultOf = (name: string, assessment: Assessment, accepted: ReadonlySet<CheckId>): Result => {
  const { run, engineVersion, verdict, checks, restart, corners } = assessment;
  const { figures, elements, events, audit, stopped, remarks } = run;
  const because = reasonsOf(assessment, accepted);
  return { scenario: name, withinRatings: because.length === 0, because, engineVersion, verdict, checks, figures, elements, events, audit, stopped, remarks, restart, corners };
};
