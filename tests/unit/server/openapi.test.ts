import { execFileSync } from 'node:child_process';
import { join } from 'node:path';

import { openApiDocument, openApiPath, problemsOf } from '../../../server/http/openapi';
import { openApiPage } from '../../../server/http/openapi-page';
import { PROBLEMS } from '../../../server/http/problem-error';
import { ROUTE_TABLE } from '../../../server/http/route-table';

type Json = Record<string, unknown>;
interface Operation {
  operationId: string;
  security: Json[];
  requestBody?: { content: Record<string, { schema: { $ref: string } }> };
  responses: Record<string, Json>;
}

const document = JSON.parse(JSON.stringify(openApiDocument(ROUTE_TABLE))) as Json & { paths: Record<string, Record<string, Operation>>; components: { schemas: Record<string, Json> } };
const operations = ROUTE_TABLE.map((route) => ({ route, operation: document.paths[openApiPath(route.path)]![route.method]! }));

const validated = (given: Json): unknown =>
  JSON.parse(execFileSync(process.execPath, [join(__dirname, '..', '..', 'support', 'validate-openapi.mjs')], { input: JSON.stringify(given), encoding: 'utf8' }));

const walk = (value: unknown, visit: (node: Json, path: string) => void, path = ''): void => {
  if (typeof value !== 'object' || value === null) return;
  if (!Array.isArray(value)) visit(value as Json, path);
  for (const [key, inner] of Object.entries(value)) walk(inner, visit, `${path}/${key}`);
};

test('the document is valid OpenAPI 3.1', () => {
  expect(validated(document)).toEqual({ valid: true, version: '3.1', errors: [] });
  expect(validated({ ...document, info: {} })).toMatchObject({ valid: false });
});

test('it holds every route of the table, and nothing else', () => {
  const described = Object.entries(document.paths).flatMap(([path, methods]) => Object.keys(methods).map((method) => `${method} ${path}`));
  expect(described.sort()).toEqual(ROUTE_TABLE.map((route) => `${route.method} ${openApiPath(route.path)}`).sort());
  expect(new Set(operations.map(({ operation }) => operation.operationId)).size).toBe(ROUTE_TABLE.length);
});

test('every reference leads to a component', () => {
  const references: string[] = [];
  walk(document, (node) => {
    if (typeof node.$ref === 'string') references.push(node.$ref);
  });
  expect(references.length).toBeGreaterThan(20);
  for (const reference of references) expect(Object.keys(document.components.schemas)).toContain(reference.replace('#/components/schemas/', ''));
});

test('every property of a schema says what it holds', () => {
  const silent: string[] = [];
  walk(document.components.schemas, (node, path) => {
    const parent = path.split('/').at(-2);
    if ((parent === 'properties' || path.endsWith('/items')) && !['type', '$ref', 'anyOf', 'oneOf', 'allOf', 'const', 'enum'].some((key) => key in node)) silent.push(path);
  });
  // Which record it is depends on the route.
  expect(silent).toEqual(['/Problem/properties/conflict']);
});

test('quantities are sent as numbers or text, and answered as numbers with their unit', () => {
  const { ScenarioSent: sent, Scenario: answered } = document.components.schemas as Record<string, { properties: Record<string, Json & { properties?: Record<string, Json> }> }>;
  expect(sent!.properties.duration).toMatchObject({ unit: 's', anyOf: [{ type: 'number' }, { type: 'string' }] });
  expect(answered!.properties.duration).toMatchObject({ unit: 's', type: 'number' });
  expect(answered!.properties.bulk?.properties?.capacitance).toMatchObject({ unit: 'F', type: 'object', required: ['nominal', 'min', 'max'] });
  expect(JSON.stringify(answered)).toContain('"frequencies":{');
});

test.each(operations.map(({ route, operation }) => [route.name, route, operation] as const))('%s names its problems and who may', (_name, route, operation) => {
  for (const code of problemsOf(route)) expect(JSON.stringify(operation.responses[PROBLEMS[code].status])).toContain(code);
  expect(operation.responses).toHaveProperty(String(route.answer.status));
  expect(operation.security.length === 0).toBe(route.who === 'anyone');
  expect(Boolean(operation.requestBody)).toBe(Boolean(route.body));
});

test('the page names every route and every code, and has no script', () => {
  const page = openApiPage(document, ROUTE_TABLE);
  for (const route of ROUTE_TABLE) expect(page).toContain(`${route.method.toUpperCase()} ${openApiPath(route.path)}`);
  for (const code of Object.keys(PROBLEMS)) expect(page).toContain(`id="${code}"`);
  expect(page).not.toMatch(/<script|\son\w+=|https?:\/\//i);
});
