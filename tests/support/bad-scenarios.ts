import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import fc, { type Arbitrary } from 'fast-check';

import { CONTRADICTIONS } from './contradictions';
import { without, written, type Path } from './json-path';

export interface BadScenario {
  /** What was done to a valid scenario, for the message of a failing test. */
  mutation: string;
  /** The field that must be named: itself, a branch above it or a leaf below it. */
  field: string;
  scenario: unknown;
}

const EXAMPLES = join(__dirname, '../../assets/examples');
/** Between them they have every block and variant of the schema. */
const valid: unknown[] = readdirSync(EXAMPLES)
  .filter((name) => name.endsWith('.json'))
  .sort()
  .map((name) => JSON.parse(readFileSync(join(EXAMPLES, name), 'utf8')) as unknown);

interface Leaf {
  path: Path;
  value: unknown;
}

const nodesOf = (value: unknown, path: Path = []): Leaf[] => {
  const children = typeof value === 'object' && value !== null ? Object.entries(value) : [];
  return [{ path, value }, ...children.flatMap(([key, child]) => nodesOf(child, [...path, key]))];
};
const leavesOf = (scenario: unknown): Leaf[] => nodesOf(scenario).filter(({ value }) => typeof value !== 'object');

const FREE_TEXT = /^(name|notes|.*\.(name|maker|reason))$/;
const WORDS = /\.(kind|switch|when|law|basis|voltageIs|behaviour|check)$/;
/** Plain numbers inside bounds around zero; text is refused there as well. */
const COEFFICIENT = /\.law\.[abc]$/;
const MAY_BE_ZERO =
  /(impedance\.(resistance|inductance)(\.\w+)?|reactanceRatio|fuse\.resistance|releaseTime|initialVoltage|esr|startDelay|rampTime|forwardVoltage|slopeResistance|phase|fault\.at|tolerance|share|cautionBelow)$/;

const TOO_LONG = 'x'.repeat(5000);
/** No quantity, whatever the field: not a number, out of every range, or of the wrong type. */
const NEVER_A_QUANTITY: readonly unknown[] = [
  -1, -1e-300, 1e308, -1e308, 5e15, 'NaN', 'Infinity', '-Infinity', '1e999', '', '   ', 'abc', '12 parsecs', '1.2.3', '4k7k', '0x10', '\u0000', '💥', TOO_LONG,
  '__proto__', 'constructor', null, true, false, [], [1, 2], {}, { nominal: 'abc' }, { value: 1 }, '\u22125 %%', '1 *2 ohm', '9'.repeat(60),
];
const NEVER_A_WORD: readonly unknown[] = ['', 'other', 'AC', 0, 1e308, null, true, [], {}, TOO_LONG, '__proto__', 'constructor', 'toString'];
const NEVER_A_TEXT: readonly unknown[] = [0, null, true, [], {}, TOO_LONG];
const NEVER_A_COEFFICIENT: readonly unknown[] = [1, -1, 1e308, '1', 'NaN', null, true, [], {}];
const NEVER_A_SCENARIO: readonly unknown[] = [null, true, 0, 1e308, '', 'scenario', [], [[]], {}];

const fieldOf = (path: Path) => path.join('.');

const badValuesFor = ({ path }: Leaf): readonly unknown[] => {
  const field = fieldOf(path);
  if (FREE_TEXT.test(field)) return NEVER_A_TEXT;
  if (WORDS.test(field)) return NEVER_A_WORD;
  if (COEFFICIENT.test(field)) return NEVER_A_COEFFICIENT;
  return MAY_BE_ZERO.test(field) ? NEVER_A_QUANTITY : [...NEVER_A_QUANTITY, 0];
};

const shown = (value: unknown) => JSON.stringify(value).slice(0, 40);

const wrongLeaf = (scenario: unknown): Arbitrary<BadScenario> =>
  fc
    .constantFrom(...leavesOf(scenario))
    .chain((leaf) => fc.constantFrom(...badValuesFor(leaf)).map((bad) => ({ leaf, bad })))
    .map(({ leaf, bad }) => ({ mutation: `${fieldOf(leaf.path)} = ${shown(bad)}`, field: fieldOf(leaf.path), scenario: written(scenario, leaf.path, bad) }));

const REQUIRED = /^(name|source|rectifier|bulk|load|ambient|source\.(kind|voltage|frequencies|impedance)|source\.programme\.\d+\.(at|switch)|fuse\.ratedCurrent|fuse\.preArcing\.\d+\.(time|i2t)|limiter\.\d+\.part|limiter\.\d+\.part\.(kind|name|law|thermal)|limiter\.\d+\.part\.law\.(law|r25|b|a|c|points|low|high|midpoint|width|resistance)|limiter\.\d+\.part\.thermal\.dissipation|limiter\.\d+\.bypass\.(closes|releaseTime|contactResistance)|rectifier\.(kind|forwardVoltage|slopeResistance)|bulk\.(capacitance|esr)|load\.(kind|power|startVoltage)|fault\.(kind|at|resistance))$/;

const missingField = (scenario: unknown): Arbitrary<BadScenario> =>
  fc
    .constantFrom(...nodesOf(scenario).filter(({ path }) => REQUIRED.test(fieldOf(path))))
    .map(({ path }) => ({ mutation: `${fieldOf(path)} left out`, field: fieldOf(path), scenario: without(scenario, path) }));

const isObject = ({ value }: Leaf) => typeof value === 'object' && value !== null && !Array.isArray(value);

const unknownField = (scenario: unknown): Arbitrary<BadScenario> =>
  fc.tuple(fc.constantFrom(...nodesOf(scenario).filter(isObject)), fc.constantFrom('Resistance', 'colour', '__proto__', 'constructor', '', '0')).map(([{ path }, key]) => {
    const extended = [...path, key];
    return { mutation: `${fieldOf(extended)} added`, field: fieldOf(extended), scenario: written(scenario, extended, 1) };
  });

const notAScenario: Arbitrary<BadScenario> = fc.constantFrom(...NEVER_A_SCENARIO).map((scenario) => ({ mutation: `the whole is ${shown(scenario)}`, field: '', scenario }));

const contradiction = (scenario: unknown): Arbitrary<BadScenario> =>
  fc.constantFrom(...CONTRADICTIONS).map(({ mutation, field, writes }) => ({
    mutation,
    field,
    scenario: writes.reduce((changed, [path, value]) => written(changed, path.split('.'), value), scenario),
  }));

const anyBadScenario: Arbitrary<BadScenario> = fc.constantFrom(...valid).chain((scenario) =>
  fc.oneof(
    { weight: 12, arbitrary: wrongLeaf(scenario) },
    { weight: 4, arbitrary: contradiction(scenario) },
    { weight: 3, arbitrary: missingField(scenario) },
    { weight: 2, arbitrary: unknownField(scenario) },
    { weight: 1, arbitrary: notAScenario },
  ),
);

/** Scenarios that no engine can compute, each with the field that an answer must name; the same for the same seed. */
export const badScenarios = (count: number, seed: number): BadScenario[] => fc.sample(anyBadScenario, { numRuns: count, seed });

/** Whether an answer speaks of the field: itself, a branch above it, or a leaf below it. */
export const names = (answered: string, field: string): boolean =>
  field === '' || answered === field || answered.startsWith(`${field}.`) || field.startsWith(`${answered}.`);
