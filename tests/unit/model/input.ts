import { readFields } from '../../../server/field-issues';
import { scenarioSchema, type ScenarioInput } from '../../../shared/model/scenario';
import { sampleScenario } from '../../support/sample-scenario';

/** The sample with one change, read as a file or a request would be: what is wrong, a line for each field. */
export const issuesOf = (more: object, base: ScenarioInput = sampleScenario()): string[] => {
  const read = readFields(scenarioSchema, { ...base, ...more });
  return read.ok ? [] : read.issues.map(({ path, message }) => `${path}: ${message}`);
};
