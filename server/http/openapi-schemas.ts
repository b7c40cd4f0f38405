import { z } from 'zod';

import { partSummarySchema } from '../../shared/contracts/part';
import { problemSchema } from '../../shared/contracts/problem';
import { scenarioRecordSchema, scenarioSummarySchema } from '../../shared/contracts/scenario';
import { checkSchema } from '../../shared/model/check';
import { cornerSchema } from '../../shared/model/corner';
import { partSchema } from '../../shared/model/part';
import { assessmentSchema, runSchema, verdictSchema } from '../../shared/model/result';
import { scenarioSchema } from '../../shared/model/scenario';
import type { Route } from './route';

type JsonSchema = Record<string, unknown>;

/** What is sent may be written as engineers write it; what is answered is in SI. So both directions have their own schemas. */
const SENT: Record<string, z.ZodType> = { ScenarioSent: scenarioSchema, PartSent: partSchema };
const ANSWERED: Record<string, z.ZodType> = {
  Scenario: scenarioSchema,
  Part: partSchema,
  Problem: problemSchema,
  ScenarioSummary: scenarioSummarySchema,
  ScenarioRecord: scenarioRecordSchema,
  PartSummary: partSummarySchema,
  Assessment: assessmentSchema,
  Run: runSchema,
  Verdict: verdictSchema,
  Check: checkSchema,
  Corner: cornerSchema,
};

const NUMBER: JsonSchema = { type: 'number' };
const BAND: JsonSchema = {
  type: 'object',
  properties: { nominal: NUMBER, min: NUMBER, max: NUMBER },
  required: ['nominal', 'min', 'max'],
};

/** zod cannot know what a transform makes; ours read text into a number, into a band, or one value into a list. */
const describeTransformed: NonNullable<Parameters<typeof z.toJSONSchema>[1]>['override'] = ({ zodSchema, jsonSchema }) => {
  if (!(zodSchema instanceof z.ZodPipe) || !(zodSchema.out instanceof z.ZodTransform)) return;
  const from = zodSchema.in;
  const kinds = from instanceof z.ZodUnion ? from.options.map((option) => option.constructor) : [];
  if (kinds.includes(z.ZodObject)) Object.assign(jsonSchema, BAND);
  else if (kinds.includes(z.ZodArray)) Object.assign(jsonSchema, { type: 'array', items: NUMBER });
  else Object.assign(jsonSchema, NUMBER);
};

const componentsOf = (named: Record<string, z.ZodType>, io: 'input' | 'output'): Record<string, JsonSchema> => {
  const registry = z.registry<{ id: string }>();
  for (const [id, schema] of Object.entries(named)) if (!registry.has(schema)) registry.add(schema, { id });
  const { schemas } = z.toJSONSchema(registry, {
    io,
    unrepresentable: 'any',
    uri: (id) => `#/components/schemas/${id}`,
    ...(io === 'output' ? { override: describeTransformed } : {}),
  });
  return Object.fromEntries(
    Object.entries(schemas).map(([id, schema]) => {
      const { $schema: _dialect, $id: _address, ...rest } = schema;
      return [id, rest];
    }),
  );
};

const capital = (name: string) => name.charAt(0).toUpperCase() + name.slice(1);

const nameOf = (schema: z.ZodType, named: Record<string, z.ZodType>, fallback: string): string =>
  Object.keys(named).find((id) => named[id] === schema) ?? fallback;

export interface NamedSchemas {
  components: Record<string, JsonSchema>;
  bodyOf: (route: Route) => JsonSchema | null;
  answerOf: (route: Route) => JsonSchema | null;
}

const reference = (id: string): JsonSchema => ({ $ref: `#/components/schemas/${id}` });

/** Gives every body and answer of the routes a name among the components. */
export const nameSchemas = (routes: readonly Route[]): NamedSchemas => {
  const sent = { ...SENT };
  const answered = { ...ANSWERED };
  for (const route of routes) {
    if (route.body) sent[`${capital(route.name)}Body`] = route.body;
    if (route.answer.schema) answered[nameOf(route.answer.schema, answered, `${capital(route.name)}Answer`)] = route.answer.schema;
  }
  return {
    components: { ...componentsOf(sent, 'input'), ...componentsOf(answered, 'output') },
    bodyOf: (route) => (route.body ? reference(nameOf(route.body, sent, '')) : null),
    answerOf: (route) => (route.answer.schema ? reference(nameOf(route.answer.schema, answered, '')) : null),
  };
};

/** Parameters of an address or a query, one by one. */
export const parametersOf = (schema: z.ZodType | undefined, place: 'path' | 'query'): JsonSchema[] => {
  if (!schema) return [];
  const { properties = {}, required = [] } = z.toJSONSchema(schema, { io: 'input' });
  return Object.entries(properties).map(([name, property]) => ({ name, in: place, required: required.includes(name), schema: property }));
};
