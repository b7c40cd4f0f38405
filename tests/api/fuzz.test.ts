import fc from 'fast-check';

import type { Route } from '../../server/http/route';
import { ROUTE_TABLE } from '../../server/http/route-table';
import { problemSchema } from '../../shared/contracts/problem';
import { ApiServer } from '../support/api-server';
import { sampleScenario } from '../support/sample-scenario';

const RUNS = 500;

let server: ApiServer;
let designer: string;
beforeAll(async () => {
  server = await ApiServer.start();
  designer = await server.signIn(server.people.designer);
});
afterAll(() => server.stop());

const nasty = fc.oneof(
  fc.constantFrom(0, -0, 1, -1, 5e-324, 1e12, 1e-12, 1e308, -1e308, null, true, '', ' ', '-', '1e999', '٣', 'NaN', '∞', '470u', '4k7', '\u202e', '__proto__', [], {}, [[]]),
  fc.string({ unit: 'grapheme', maxLength: 80 }),
  fc.jsonValue({ maxDepth: 3 }) as fc.Arbitrary<unknown>,
);

const pathsOf = (value: unknown, above: string[] = []): string[][] =>
  typeof value === 'object' && value !== null ? [above, ...Object.entries(value).flatMap(([key, inner]) => pathsOf(inner, [...above, key]))] : [above];

const replaced = (value: unknown, path: readonly string[], by: unknown): unknown => {
  const [key, ...rest] = path;
  if (key === undefined) return by;
  const copy = (Array.isArray(value) ? [...value] : { ...(value as object) }) as Record<string, unknown>;
  copy[key] = replaced(copy[key], rest, by);
  return copy;
};

/** A right scenario with one thing in it gone wrong, or something else altogether. */
const scenarios = fc.oneof(
  { weight: 4, arbitrary: fc.tuple(fc.constantFrom(...pathsOf(sampleScenario())), nasty).map(([path, value]) => replaced(sampleScenario(), path, value)) },
  { weight: 1, arbitrary: nasty },
);
const ids = fc.oneof(fc.uuid(), fc.constantFrom('..', '%00', '%zz', "'", 'null', '0', 'ABCDEF', '🔌'), fc.string({ maxLength: 40 }).map(encodeURIComponent));
const queries = fc.record({ after: fc.base64String({ maxLength: 60 }), search: fc.string({ unit: 'binary', maxLength: 130 }), limit: fc.oneof(fc.integer(), nasty), kind: fc.string({ maxLength: 12 }), other: nasty }, { requiredKeys: [] });

const bodyFor = (route: Route): fc.Arbitrary<unknown> => {
  if (route.name === 'createScenario' || route.name === 'saveScenario')
    return fc.record({ id: fc.oneof(fc.uuid(), nasty), version: fc.oneof(fc.integer(), nasty), scenario: scenarios }, { requiredKeys: ['scenario'] });
  // A right scenario would be computed; the engine has its own trials.
  if (route.name === 'simulate') return fc.record({ scenario: nasty });
  if (route.name === 'signIn') return fc.record({ email: fc.oneof(fc.emailAddress(), nasty), password: nasty });
  return fc.oneof(nasty, fc.dictionary(fc.constantFrom('name', 'days', 'other'), nasty));
};

const written = (value: unknown): string => (typeof value === 'string' ? value : JSON.stringify(value) ?? '').toWellFormed();
const searchOf = (query: Record<string, unknown>) => new URLSearchParams(Object.entries(query).map(([key, value]): [string, string] => [key, written(value)])).toString();

test.each(ROUTE_TABLE.filter(({ name }) => name !== 'signOut').map((route) => [route.name, route] as const))(
  '%s answers whatever is thrown at it, and never with a fault of its own',
  async (_name, route) => {
    // Counting failures and hashing passwords is slow on purpose.
    const numRuns = route.name === 'signIn' ? 60 : RUNS;
    const inputs = fc.record({ id: ids, query: queries, body: bodyFor(route) });
    await fc.assert(
      fc.asyncProperty(inputs, async ({ id, query, body }) => {
        const address = `${route.path.replace(':id', id)}${route.query ? `?${searchOf(query)}` : ''}`;
        const request = server.send(route.method, address, designer);
        const answer = route.body ? await request.set('Content-Type', 'application/json').send(JSON.stringify(body) ?? '') : await request;
        expect(answer.status).toBeLessThan(500);
        if (answer.status >= 400) expect(problemSchema.parse(answer.body).status).toBe(answer.status);
        else expect(answer.status).toBe(route.answer.status);
      }),
      { numRuns },
    );
  },
  120_000,
);
