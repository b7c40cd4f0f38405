import { z } from 'zod';

import { readFields } from '../../../server/field-issues';
import { scenarioSchema } from '../../../shared/model/scenario';
import { sampleScenario } from '../../support/sample-scenario';

const issuesOf = (schema: z.ZodType, given: unknown) => {
  const read = readFields(schema, given);
  return read.ok ? [] : read.issues;
};

test('what is right is read', () => {
  expect(readFields(z.object({ a: z.coerce.number() }), { a: '5' })).toEqual({ ok: true, value: { a: 5 } });
});

test('a missing field is named as missing', () => {
  expect(issuesOf(z.object({ a: z.object({ b: z.string() }) }), { a: {} })).toEqual([{ path: 'a.b', message: 'is missing' }]);
});

test('each field that does not belong is named by itself', () => {
  expect(issuesOf(z.strictObject({}), { x: 1, y: 2 }).map(({ path }) => path)).toEqual(['x', 'y']);
});

test('of an input that may be written in several ways, the field inside is named, not the whole', () => {
  const scenario = sampleScenario();
  const given = { ...scenario, bulk: { ...scenario.bulk, capacitance: { nominal: '470u', tolerance: 'some' } } };
  expect(issuesOf(scenarioSchema, given).map(({ path }) => path)).toEqual(['bulk.capacitance.tolerance']);
});

test('a thousand wrong fields are cut to what a person can read', () => {
  const given = Object.fromEntries(Array.from({ length: 1000 }, (_, index) => [`x${index}`, index]));
  expect(issuesOf(z.strictObject({}), given)).toHaveLength(50);
});
