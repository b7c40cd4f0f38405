import { scenarioSchema, type Scenario } from '../../../shared/model/scenario';
import { readFields } from '../../field-issues';
import { overridden, type Override } from './override';
import { InputProblem } from './problem';

const parsed = (text: string): unknown => {
  try {
    return JSON.parse(text.replace(/^\ufeff/, ''));
  } catch (error) {
    throw new InputProblem('The scenario is not valid JSON.', [{ path: '', message: (error as Error).message }]);
  }
};

/** @throws InputProblem that names every wrong field */
export const readScenario = (text: string, overrides: readonly Override[] = []): Scenario => {
  const given = overrides.reduce(overridden, parsed(text));
  const read = readFields(scenarioSchema, given);
  if (read.ok) return read.value;
  throw new InputProblem('The scenario cannot be computed as it stands.', read.issues);
};
