import type { ErrorCode } from '../../shared/error-codes';
import { version } from '../../package.json';
import { nameSchemas, type NamedSchemas, parametersOf } from './openapi-schemas';
import { PROBLEMS } from './problem-error';
import type { Route } from './route';

type Json = Record<string, unknown>;

const INTRODUCTION = `Sizes inrush-current limiters and PTC resettable fuses. Quantities are sent as SI numbers, or as text such as
"470u", "4k7" or "85 °C"; they are answered in SI. Temperatures are in kelvin. A result says whether each value is within its
rating; mains voltage, stored charge and hot parts can hurt: local codes and licensed practice come first.`.replace(/\n/g, ' ');

/** Problems that follow from what kind of route it is. */
export const problemsOf = (route: Route): ErrorCode[] => {
  const codes = new Set<ErrorCode>(['internal', 'database-unavailable', ...(route.problems ?? [])]);
  if (route.method !== 'get') codes.add('cross-site');
  if (route.who !== 'anyone') codes.add('not-signed-in').add('not-allowed');
  if (route.params || route.query || route.body) codes.add('invalid-input');
  if (route.body) codes.add('malformed-body').add('body-too-large').add('unsupported-media');
  return [...codes].sort((a, b) => PROBLEMS[a].status - PROBLEMS[b].status);
};

const problemAnswers = (route: Route): Json => {
  const byStatus = new Map<number, ErrorCode[]>();
  for (const code of problemsOf(route)) byStatus.set(PROBLEMS[code].status, [...(byStatus.get(PROBLEMS[code].status) ?? []), code]);
  const answers = [...byStatus].map(([status, codes]) => {
    const description = codes.map((code) => `${code}: ${PROBLEMS[code].title}`).join('; ');
    return [status, { description, content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } } }];
  });
  return Object.fromEntries(answers);
};

const whoMay = (route: Route): string => {
  if (route.who === 'anyone') return 'Anyone.';
  return `Roles: ${route.who.join(', ')}.${route.sessionOnly ? ' Not with a bearer token.' : ''}`;
};

const securityOf = (route: Route): Json[] => {
  if (route.who === 'anyone') return [];
  return route.sessionOnly ? [{ session: [] }] : [{ session: [] }, { bearer: [] }];
};

const operationOf = (route: Route, schemas: NamedSchemas): Json => {
  const body = schemas.bodyOf(route);
  const answer = schemas.answerOf(route);
  return {
    operationId: route.name,
    tags: [route.tag],
    summary: route.summary,
    description: [route.description, whoMay(route)].filter(Boolean).join(' '),
    security: securityOf(route),
    parameters: [...parametersOf(route.params, 'path'), ...parametersOf(route.query, 'query')],
    ...(body ? { requestBody: { required: true, content: { 'application/json': { schema: body } } } } : {}),
    responses: {
      [route.answer.status]: { description: route.answer.description, ...(answer ? { content: { 'application/json': { schema: answer } } } : {}) },
      ...problemAnswers(route),
    },
  };
};

/** Express writes a parameter as :id, OpenAPI as {id}. */
export const openApiPath = (path: string): string => path.replace(/:(\w+)/g, '{$1}');

export const openApiDocument = (routes: readonly Route[]): Json => {
  const schemas = nameSchemas(routes);
  const paths: Record<string, Json> = {};
  for (const route of routes) (paths[openApiPath(route.path)] ??= {})[route.method] = operationOf(route, schemas);
  return {
    openapi: '3.1.0',
    info: { title: 'Tidegate API', version, description: INTRODUCTION },
    servers: [{ url: '/' }],
    paths,
    components: {
      schemas: schemas.components,
      securitySchemes: {
        session: { type: 'apiKey', in: 'cookie', name: '__Host-tidegate-access', description: 'Set by signing in. Unsafe methods must come from the same origin.' },
        bearer: { type: 'http', scheme: 'bearer', description: 'A token made under /api/tokens' },
      },
    },
  };
};
