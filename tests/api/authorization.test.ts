import { randomUUID } from 'node:crypto';

import { ROUTE_TABLE } from '../../server/http/route-table';
import type { Route } from '../../server/http/route';
import { PartRow } from '../../server/parts/part-entity';
import { ROLES, type Role } from '../../shared/contracts/session';
import { partSchema } from '../../shared/model/part';
import { ApiServer } from '../support/api-server';
import { samplePart, sampleScenario } from '../support/sample-scenario';

interface Row {
  /** Who may; everybody else who is signed in gets 403. */
  may: readonly Role[] | 'anyone';
  answers: number;
  bearer: 'may' | 'refused' | 'not needed';
  /** Makes what the request needs and gives its address and body. */
  prepare?: (context: Context) => Promise<{ id: string; body?: object }> | { id: string; body?: object };
  /** Another team's record is like an absent one. */
  otherTeam?: 404;
  body?: object;
}

interface Context {
  server: ApiServer;
  designer: string;
  teamId: string;
}

const newScenario = async ({ server, designer }: Context) => {
  const answer = await server.send('post', '/api/scenarios', designer, { scenario: sampleScenario() }).expect(201);
  return String(answer.body.id);
};

const scenario = async (context: Context) => ({ id: await newScenario(context) });
const part = async ({ server, teamId }: Context) => {
  const document = partSchema.parse(samplePart());
  const id = randomUUID();
  await server.database.getRepository(PartRow).insert({ id, teamId, name: document.name, kind: document.kind, revision: 1, document, provenance: [], createdAt: new Date() });
  return { id };
};

const everyone = { may: ROLES, bearer: 'may' } as const;
const designers = { may: ['designer'], bearer: 'may' } as const;
const inPerson = { may: ROLES, bearer: 'refused' } as const;

/** What the product promises, written down apart from the code that keeps it. */
const MATRIX: Record<string, Row> = {
  'GET /api/health': { may: 'anyone', answers: 200, bearer: 'not needed' },
  'POST /api/session': { may: 'anyone', answers: 401, bearer: 'not needed', body: { email: 'nobody@test.example', password: 'wrong' } },
  'GET /api/session': { ...everyone, answers: 200 },
  'DELETE /api/session': { ...inPerson, answers: 204 },
  'GET /api/tokens': { ...inPerson, answers: 200 },
  'POST /api/tokens': { ...inPerson, answers: 201, body: { name: 'bench' } },
  'DELETE /api/tokens/:id': { ...inPerson, answers: 404, prepare: () => ({ id: randomUUID() }) },
  'GET /api/scenarios': { ...everyone, answers: 200 },
  'POST /api/scenarios': { ...designers, answers: 201, body: { scenario: sampleScenario() } },
  'GET /api/scenarios/:id': { ...everyone, answers: 200, prepare: scenario, otherTeam: 404 },
  'PUT /api/scenarios/:id': {
    ...designers,
    answers: 200,
    otherTeam: 404,
    prepare: async (context) => ({ id: await newScenario(context), body: { version: 1, scenario: sampleScenario({ name: 'Changed' }) } }),
  },
  'DELETE /api/scenarios/:id': { ...designers, answers: 204, prepare: scenario, otherTeam: 404 },
  'GET /api/parts': { ...everyone, answers: 200 },
  'GET /api/parts/:id': { ...everyone, answers: 200, prepare: part, otherTeam: 404 },
  'POST /api/simulations': { ...everyone, answers: 200, body: { scenario: sampleScenario() } },
};

const keyOf = (route: Route) => `${route.method.toUpperCase()} ${route.path}`;
const rowOf = (route: Route): Row => MATRIX[keyOf(route)]!;

let server: ApiServer;
let sessions: Record<Role, string>;
let strangerSession: string;
let context: Context;

beforeAll(async () => {
  server = await ApiServer.start();
  const entries = await Promise.all(ROLES.map(async (role) => [role, await server.signIn(server.people[role])] as const));
  sessions = Object.fromEntries(entries) as Record<Role, string>;
  strangerSession = await server.signIn(server.stranger);
  context = { server, designer: sessions.designer, teamId: server.people.designer.teamId };
});
afterAll(() => server.stop());

const prepared = async (route: Route) => {
  const row = rowOf(route);
  const made = await row.prepare?.(context);
  return { path: route.path.replace(':id', made?.id ?? ''), body: made?.body ?? row.body };
};

test('every route has a row in the matrix, and every row a route', () => {
  expect(ROUTE_TABLE.map(keyOf).sort()).toEqual(Object.keys(MATRIX).sort());
});

describe.each(ROUTE_TABLE.map((route) => [keyOf(route), route] as const))('%s', (_key, route) => {
  const row = rowOf(route);
  const guarded = row.may !== 'anyone';

  test(guarded ? 'is closed to who is signed out' : 'is open to anyone', async () => {
    const { path, body } = await prepared(route);
    const answer = await server.send(route.method, path, null, body);
    expect(answer.status).toBe(guarded ? 401 : row.answers);
    if (guarded) expect(answer.body).toMatchObject({ code: 'not-signed-in', status: 401 });
  });

  test.each(ROLES)('knows what a %s may do', async (role) => {
    const { path, body } = await prepared(route);
    const who = route.path === '/api/session' ? await server.signIn(server.people[role]) : sessions[role];
    const answer = await server.send(route.method, path, who, body);
    const may = row.may === 'anyone' || row.may.includes(role);
    expect(answer.status).toBe(may ? row.answers : 403);
    if (!may) expect(answer.body).toMatchObject({ code: 'not-allowed', status: 403 });
  });

  if (row.otherTeam) {
    test("answers another team's record as if it were absent", async () => {
      const { path, body } = await prepared(route);
      const foreign = await server.send(route.method, path, strangerSession, body).expect(row.otherTeam!);
      const absent = await server.send(route.method, route.path.replace(':id', randomUUID()), strangerSession, body).expect(404);
      const { instance: _one, ...foreignProblem } = foreign.body as Record<string, unknown>;
      const { instance: _two, ...absentProblem } = absent.body as Record<string, unknown>;
      expect(foreignProblem).toEqual(absentProblem);
      await server.send('get', path, sessions.reviewer).expect(200);
    });
  }

  if (guarded) {
    test(`a bearer token ${row.bearer === 'may' ? 'opens it too' : 'does not open it'}`, async () => {
      const token = await server.send('post', '/api/tokens', sessions.designer, { name: 'matrix' }).expect(201);
      const { path, body } = await prepared(route);
      const answer = await server.withToken(route.method, path, String(token.body.secret), body);
      expect(answer.status).toBe(row.bearer === 'may' ? row.answers : 403);
    });

    test('is closed to someone who was deactivated', async () => {
      const { path, body } = await prepared(route);
      await server.database.query('UPDATE person SET active = false WHERE id = $1', [server.stranger.id]);
      try {
        await server.send(route.method, path, strangerSession, body).expect(401);
      } finally {
        await server.database.query('UPDATE person SET active = true WHERE id = $1', [server.stranger.id]);
      }
    });
  }

  if (route.params) {
    test('names a wrong id', async () => {
      const { body } = await prepared(route);
      const answer = await server.send(route.method, route.path.replace(':id', 'seven'), sessions.designer, body).expect(400);
      expect(answer.body).toMatchObject({ code: 'invalid-input', issues: [{ path: 'id' }] });
    });
  }

  if (route.body) {
    test('names a field that is not one of its own', async () => {
      const { path, body } = await prepared(route);
      const answer = await server.send(route.method, path, sessions.designer, { ...body, surprise: 1 }).expect(400);
      expect(answer.body).toMatchObject({ code: 'invalid-input', issues: [{ path: 'surprise', message: 'is not a field here' }] });
    });
  }
});
