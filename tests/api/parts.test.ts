import { randomUUID } from 'node:crypto';

import { PartRow } from '../../server/parts/part-entity';
import { type PartRecord, partListSchema, partRecordSchema } from '../../shared/contracts/part';
import { type PartInput, partSchema } from '../../shared/model/part';
import { ApiServer, type TestPerson } from '../support/api-server';
import { samplePart, sampleScenario } from '../support/sample-scenario';

const RESISTOR: PartInput = { kind: 'resistor', name: 'Quillon Bittern', law: { law: 'fixed', resistance: '47 ±5 %' }, thermal: { dissipation: '20m', heatCapacity: 2 } };
const PTC: PartInput = {
  kind: 'polymer-ptc',
  name: 'Marrowby Teal',
  law: { law: 'sigmoid', low: { nominal: 0.2, min: 0.15, max: 0.3 }, high: '1M', midpoint: '125 °C', width: 4 },
  thermal: { dissipation: '15m', heatCapacity: 0.3 },
};
const PROVENANCE: PartRecord['provenance'] = [{ figure: 'law.r25', document: 'Invented data sheet', page: '2', condition: '25 °C, zero power' }];

let server: ApiServer;
let librarian: string;
let ids: Record<string, string>;

const add = async (owner: TestPerson, input: PartInput, approvedById: string | null = null): Promise<string> => {
  const document = partSchema.parse(input);
  const id = randomUUID();
  const row = { id, teamId: owner.teamId, name: document.name, kind: document.kind, revision: 1, document, provenance: PROVENANCE, approvedById, createdAt: new Date() };
  await server.database.getRepository(PartRow).insert(row);
  return id;
};

beforeAll(async () => {
  server = await ApiServer.start();
  librarian = await server.signIn(server.people.librarian);
  const home = server.people.librarian;
  ids = { ntc: await add(home, samplePart(), server.people.admin.id), resistor: await add(home, RESISTOR), ptc: await add(home, PTC) };
  await add(server.stranger, samplePart({ name: 'Of another team' }));
});
afterAll(() => server.stop());

const list = async (query = '') => partListSchema.parse((await server.send('get', `/api/parts${query}`, librarian).expect(200)).body);
const names = async (query = '') => (await list(query)).parts.map(({ part }) => part.name);
const read = async (id: string) => partRecordSchema.parse((await server.send('get', `/api/parts/${id}`, librarian).expect(200)).body);

describe('the list', () => {
  test("holds the team's parts by name, and no other's", async () => {
    expect(await names()).toEqual(['Aldersyke Heron', 'Marrowby Teal', 'Quillon Bittern']);
  });

  test('goes page by page', async () => {
    const first = await list('?limit=2');
    expect(first.parts.map(({ part }) => part.name)).toEqual(['Aldersyke Heron', 'Marrowby Teal']);
    expect(await names(`?limit=2&after=${first.next}`)).toEqual(['Quillon Bittern']);
  });

  test('can be narrowed to a kind and to a piece of the name', async () => {
    expect(await names('?kind=polymer-ptc')).toEqual(['Marrowby Teal']);
    expect(await names('?search=HERON')).toEqual(['Aldersyke Heron']);
    expect(await names('?kind=resistor&search=heron')).toEqual([]);
  });

  test('names a kind that does not exist', async () => {
    const answer = await server.send('get', '/api/parts?kind=varistor', librarian).expect(400);
    expect(answer.body).toMatchObject({ issues: [{ path: 'kind' }] });
  });
});

describe('a part', () => {
  test('comes with who approved it and where its figures come from', async () => {
    expect(await read(ids.ntc!)).toMatchObject({ revision: 1, approvedBy: server.people.admin.name, provenance: PROVENANCE, part: partSchema.parse(samplePart()), resistance25: 10 });
    expect((await read(ids.resistor!)).approvedBy).toBeNull();
  });

  test.each(['ntc', 'ptc', 'resistor'])('comes with its curve: %s', async (kind) => {
    const { curve } = await read(ids[kind]!);
    expect(curve.temperature.length).toBeGreaterThan(20);
    expect(curve.valid.min).toBeLessThan(curve.valid.max);
    for (const series of [curve.nominal, curve.low, curve.high]) expect(series).toHaveLength(curve.temperature.length);
    curve.nominal.forEach((nominal, index) => {
      expect(curve.low[index]!).toBeLessThanOrEqual(nominal);
      expect(curve.high[index]!).toBeGreaterThanOrEqual(nominal);
    });
  });

  test('names the scenarios of the team that took it from the library, with their verdict', async () => {
    const designer = await server.signIn(server.people.designer);
    const users = { limiter: [{ part: samplePart({ libraryId: ids.ntc! }) }] };
    const first = await server.send('post', '/api/scenarios', designer, { scenario: sampleScenario({ name: 'B uses it', ...users }) }).expect(201);
    await server.send('post', '/api/scenarios', designer, { scenario: sampleScenario({ name: 'A uses it too', ...users }) }).expect(201);
    await server.send('post', '/api/scenarios', designer, { scenario: sampleScenario({ name: 'C has one of its own' }) }).expect(201);
    await server.send('post', '/api/scenarios', await server.signIn(server.stranger), { scenario: sampleScenario({ name: 'D of strangers', ...users }) }).expect(201);
    await server.composed.verdicts.settled();
    const { usedIn } = await read(ids.ntc!);
    expect(usedIn.map(({ name }) => name)).toEqual(['A uses it too', 'B uses it']);
    const { verdict } = (await server.send('get', `/api/scenarios/${String(first.body.id)}`, designer).expect(200)).body as { verdict: { status: string } };
    expect(usedIn[1]).toEqual({ id: first.body.id, name: 'B uses it', status: verdict.status });
  });
});
