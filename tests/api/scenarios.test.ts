import { randomUUID } from 'node:crypto';

import { ScenarioRow } from '../../server/scenarios/scenario-entity';
import { type ScenarioRecord, scenarioListSchema, scenarioRecordSchema } from '../../shared/contracts/scenario';
import { type ScenarioInput, scenarioSchema } from '../../shared/model/scenario';
import { ApiServer } from '../support/api-server';
import { samplePart, sampleScenario } from '../support/sample-scenario';

let server: ApiServer;
let designer: string;
let reviewer: string;
beforeAll(async () => {
  server = await ApiServer.start();
  [designer, reviewer] = [await server.signIn(server.people.designer), await server.signIn(server.people.reviewer)];
});
afterAll(() => server.stop());
beforeEach(() => server.database.query('DELETE FROM scenario'));

const post = (body: { id?: string; scenario: ScenarioInput }) => server.send('post', '/api/scenarios', designer, body);
const put = (id: string, version: number, scenario: ScenarioInput) => server.send('put', `/api/scenarios/${id}`, designer, { version, scenario });
const create = async (scenario = sampleScenario()): Promise<ScenarioRecord> => scenarioRecordSchema.parse((await post({ scenario }).expect(201)).body);
const read = async (id: string): Promise<ScenarioRecord> => scenarioRecordSchema.parse((await server.send('get', `/api/scenarios/${id}`, reviewer).expect(200)).body);
const list = async (query = '') => scenarioListSchema.parse((await server.send('get', `/api/scenarios${query}`, designer).expect(200)).body);
const names = async (query = '') => (await list(query)).scenarios.map(({ name }) => name);

describe('creating', () => {
  test('answers with the scenario in SI, whichever way it was written', async () => {
    const answer = await post({ scenario: sampleScenario({ name: 'Bench supply' }) }).expect(201);
    const record = scenarioRecordSchema.parse(answer.body);
    expect(answer.headers.location).toBe(`/api/scenarios/${record.id}`);
    expect(record).toMatchObject({ name: 'Bench supply', version: 1, mayEdit: true, updatedBy: server.people.designer.name, keyFigures: '230 V, NTC 10 Ω' });
    expect(record.scenario).toEqual(scenarioSchema.parse(sampleScenario({ name: 'Bench supply' })));
    expect(record.path).toEqual({ source: 'ac', fuse: false, elements: [{ kind: 'ntc', bypass: false }], rectifier: 'bridge', load: 'resistance' });
  });

  test('twice with the same id and content makes one', async () => {
    const id = randomUUID();
    const bodies = [1, 2, 3].map(() => post({ id: id.toUpperCase(), scenario: sampleScenario() }));
    const answers = await Promise.all(bodies);
    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201]);
    expect((await list()).scenarios.map((one) => one.id)).toEqual([id]);
  });

  test('twice with the same id and other content is refused, with the one that is there', async () => {
    const { id } = await create(sampleScenario({ name: 'First' }));
    const answer = await post({ id, scenario: sampleScenario({ name: 'Second' }) }).expect(409);
    expect(answer.body).toMatchObject({ code: 'version-conflict', conflict: { id, name: 'First' } });
  });

  test("with an id of another team's tells nothing about theirs", async () => {
    const stranger = await server.signIn(server.stranger);
    const id = randomUUID();
    await server.send('post', '/api/scenarios', stranger, { id, scenario: sampleScenario() }).expect(201);
    const answer = await post({ id, scenario: sampleScenario() }).expect(409);
    expect(answer.body).not.toHaveProperty('conflict');
  });

  test('names the wrong field of a scenario', async () => {
    const scenario = { ...sampleScenario(), bulk: { capacitance: 'plenty', esr: 0 } };
    const answer = await post({ scenario }).expect(400);
    expect(answer.body).toMatchObject({ code: 'invalid-input', issues: [{ path: 'scenario.bulk.capacitance' }] });
  });
});

describe('saving', () => {
  test('wants the version that it starts from', async () => {
    const { id } = await create();
    const answer = await server.send('put', `/api/scenarios/${id}`, designer, { scenario: sampleScenario() }).expect(400);
    expect(answer.body).toMatchObject({ issues: [{ path: 'version', message: 'is missing' }] });
  });

  test('raises the version and keeps what was written', async () => {
    const { id } = await create();
    const saved = scenarioRecordSchema.parse((await put(id, 1, sampleScenario({ name: 'Renamed', notes: 'µ, Ω and “quotes”' })).expect(200)).body);
    expect(saved).toMatchObject({ version: 2, name: 'Renamed' });
    expect((await read(id)).scenario.notes).toBe('µ, Ω and “quotes”');
  });

  test('over a newer version saves nothing and answers with the newer one', async () => {
    const { id } = await create();
    await put(id, 1, sampleScenario({ name: 'Theirs' })).expect(200);
    const answer = await put(id, 1, sampleScenario({ name: 'Mine' })).expect(409);
    expect(answer.body).toMatchObject({ code: 'version-conflict', conflict: { version: 2, name: 'Theirs', scenario: { name: 'Theirs' } } });
    expect(scenarioRecordSchema.parse((answer.body as { conflict: unknown }).conflict).mayEdit).toBe(true);
    expect((await read(id)).name).toBe('Theirs');
  });

  test('by many at once lets exactly one win', async () => {
    const { id } = await create();
    const writers = Array.from({ length: 8 }, (_, index) => put(id, 1, sampleScenario({ name: `Writer ${index}` })));
    const answers = await Promise.all(writers);
    const won = answers.filter(({ status }) => status === 200);
    expect(won).toHaveLength(1);
    expect(answers.filter(({ status }) => status === 409)).toHaveLength(7);
    expect(await read(id)).toMatchObject({ version: 2, name: (won[0]!.body as ScenarioRecord).name });
  });

  test('a version from the future is as stale as one from the past', async () => {
    const { id } = await create();
    await put(id, 2, sampleScenario()).expect(409);
  });
});

describe('deleting', () => {
  test('removes it, once', async () => {
    const { id } = await create();
    await server.send('delete', `/api/scenarios/${id}`, designer).expect(204);
    await server.send('get', `/api/scenarios/${id}`, designer).expect(404);
    await server.send('delete', `/api/scenarios/${id}`, designer).expect(404);
    await put(id, 1, sampleScenario()).expect(404);
  });
});

describe('reading', () => {
  test('tells who may not edit', async () => {
    const { id } = await create();
    expect((await read(id)).mayEdit).toBe(false);
  });
});

describe('the list', () => {
  test('shows the last changed first', async () => {
    const first = await create(sampleScenario({ name: 'First' }));
    await create(sampleScenario({ name: 'Second' }));
    expect(await names()).toEqual(['Second', 'First']);
    await put(first.id, 1, sampleScenario({ name: 'First again' }));
    expect(await names()).toEqual(['First again', 'Second']);
  });

  test('goes page by page through everything once, also where times are equal', async () => {
    for (let index = 0; index < 7; index += 1) await create(sampleScenario({ name: `Scenario ${index}` }));
    await server.database.query(`UPDATE scenario SET updated_at = '2026-01-01T00:00:00Z' WHERE name < 'Scenario 5'`);
    const seen: string[] = [];
    let next: string | null = null;
    do {
      const page = await list(`?limit=2${next === null ? '' : `&after=${encodeURIComponent(next)}`}`);
      expect(page.scenarios.length).toBeLessThanOrEqual(2);
      seen.push(...page.scenarios.map(({ name }) => name));
      next = page.next;
    } while (next !== null);
    expect([...seen].sort()).toEqual(Array.from({ length: 7 }, (_, index) => `Scenario ${index}`));
  });

  test('finds a piece of a name in any case, and takes wildcards for what they are', async () => {
    await create(sampleScenario({ name: 'Charger 100%' }));
    await create(sampleScenario({ name: 'Lamp_driver' }));
    await create(sampleScenario({ name: 'Lamp driver' }));
    expect(await names('?search=CHARG')).toEqual(['Charger 100%']);
    expect(await names('?search=%25')).toEqual(['Charger 100%']);
    expect(await names('?search=lamp_')).toEqual(['Lamp_driver']);
    expect(await names(`?search=${encodeURIComponent("'; DROP TABLE scenario; --")}`)).toEqual([]);
  });

  test.each(['?limit=0', '?limit=201', '?limit=many', '?after=nonsense', '?after=WzEsMl0', '?order=name', `?after=${Buffer.from(JSON.stringify(['never', randomUUID()])).toString('base64url')}`])(
    'names what is wrong in %s',
    async (query) => {
      const answer = await server.send('get', `/api/scenarios${query}`, designer).expect(400);
      expect(answer.body).toMatchObject({ code: 'invalid-input', issues: [{ path: query.slice(1, query.indexOf('=')) }] });
    },
  );

  test("shows nothing of another team's", async () => {
    await create();
    const stranger = await server.send('get', '/api/scenarios', await server.signIn(server.stranger)).expect(200);
    expect(stranger.body).toEqual({ scenarios: [], next: null });
  });
});

describe('the verdict of a saved draft', () => {
  test('is not waited for by the answer, and is there once it has been computed', async () => {
    const record = await create(sampleScenario({ limits: { peakCurrent: 1 } }));
    expect(record.verdict).toBeNull();
    await server.composed.verdicts.settled();
    const [summary] = (await list()).scenarios;
    expect(summary).toMatchObject({ version: 1, verdict: { status: 'fail' }, closest: { status: 'fail', rating: 1 } });
    expect(summary!.verdict!.counts.fail).toBeGreaterThan(0);
  });

  test('is that of the newest version', async () => {
    const { id } = await create(sampleScenario({ limits: { peakCurrent: 1 } }));
    await put(id, 1, sampleScenario({ limits: { peakCurrent: '10k' } })).expect(200);
    await server.composed.verdicts.settled();
    const { checks } = (await server.send('post', '/api/simulations', designer, { scenario: sampleScenario({ limits: { peakCurrent: '10k' } }) }).expect(200)).body.assessment as { checks: unknown[] };
    expect((await read(id)).closest).toEqual(checks[0]);
  });

  test('of an older engine is computed again', async () => {
    const { id } = await create();
    await server.composed.verdicts.settled();
    const computed = (await read(id)).verdict;
    const rows = server.database.getRepository(ScenarioRow);
    const { engineVersion } = await rows.findOneByOrFail({ id });
    await rows.update({ id }, { engineVersion: 'older', verdict: { status: 'pass', counts: { fail: 0, 'not-assessed': 0, caution: 0, pass: 0, 'set-aside': 0 } } });
    await server.composed.verdicts.discardOlderThan(engineVersion!);
    server.composed.verdicts.wake();
    await server.composed.verdicts.settled();
    expect((await read(id)).verdict).toEqual(computed);
    expect(await rows.findOneByOrFail({ id })).toMatchObject({ engineVersion });
  });
});

test('key figures name supply, limiter and contact', async () => {
  const bypass = { releaseTime: 0.05, contactResistance: 0.02 };
  const timed = await create(sampleScenario({ limiter: [{ part: samplePart(), bypass: { ...bypass, closes: { when: 'time', at: '300m' } } }] }));
  expect(timed.keyFigures).toBe('230 V, NTC 10 Ω, bypass 300 ms');
  const byVoltage = await create(sampleScenario({ limiter: [{ part: samplePart(), bypass: { ...bypass, closes: { when: 'bus-voltage', above: 330 } } }] }));
  expect(byVoltage.keyFigures).toBe('230 V, NTC 10 Ω, bypass at 330 V');
  const bare = await create(sampleScenario({ source: { kind: 'dc', voltage: 24, impedance: { resistance: 0.1, inductance: 0 } }, limiter: [], rectifier: { kind: 'none' } }));
  expect(bare.keyFigures).toBe('24 V DC, no limiter');
});
