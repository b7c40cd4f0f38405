import { overridden } from '../../../server/bin/simulate/override';
import { readScenario } from '../../../server/bin/simulate/read-scenario';
import { InputProblem } from '../../../server/bin/simulate/problem';
import { sampleScenario } from '../../support/sample-scenario';

const text = JSON.stringify(sampleScenario());
const at = (path: string, value: unknown) => ({ path: path.split('.'), value });

const issuesAt = (path: string, value: unknown) => {
  try {
    readScenario(text, [at(path, value)]);
  } catch (error) {
    if (error instanceof InputProblem) return error.issues;
    throw error;
  }
  return [];
};

describe('a field is written anew by its dotted path', () => {
  it('in an object', () => expect(readScenario(text, [at('bulk.capacitance', '100u')]).bulk.capacitance.nominal).toBe(100e-6));
  it('in a list', () => expect(readScenario(text, [at('limiter.0.part.name', 'Spare')]).limiter[0]?.part.name).toBe('Spare'));
  it('in a branch that was absent', () => expect(readScenario(text, [at('limits.peakCurrent', '40 A')]).limits.peakCurrent).toBe(40));
  it('a bare temperature is in °C, as a person types it', () => expect(readScenario(text, [at('ambient', '40')]).ambient.nominal).toBeCloseTo(313.15, 10));
  it('the last of two wins', () => expect(readScenario(text, [at('duration', '1'), at('duration', '2')]).duration).toBe(2));
  it('the scenario itself stays as it was', () => {
    const scenario = { bulk: { esr: 1 } };
    overridden(scenario, at('bulk.esr', 2));
    expect(scenario).toEqual({ bulk: { esr: 1 } });
  });
});

describe('an override that does not fit is refused with its path', () => {
  it.each<[string, RegExp]>([
    ['limiter.7.part.name', /limiter has 1 entries, counted from 0/],
    ['limiter.first', /counted from 0/],
    ['name.first', /name has no fields below it/],
    ['bulk.colour', /is not a field here/],
    ['__proto__.polluted', /is not a field here/],
    ['bulk.constructor', /is not a field here/],
  ])('%s', (path, message) => {
    const issues = issuesAt(path, '1');
    expect(issues.map(({ message: said }) => said).join()).toMatch(message);
    expect(issues.some(({ path: named }) => named === path || path.startsWith(named))).toBe(true);
    expect(Object.hasOwn(Object.prototype, 'polluted')).toBe(false);
  });
});
