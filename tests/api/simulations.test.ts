import { randomUUID } from 'node:crypto';
import { existsSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { setTimeout as wait } from 'node:timers/promises';

import { simulatedSchema } from '../../shared/contracts/simulation';
import { ApiServer } from '../support/api-server';
import { sampleScenario } from '../support/sample-scenario';

const HELD_WORKER = join(__dirname, '..', 'support', 'held-worker.ts');

describe('a run', () => {
  let server: ApiServer;
  let engineer: string;
  beforeAll(async () => {
    server = await ApiServer.start();
    engineer = await server.signIn(server.people['test-engineer']);
  });
  afterAll(() => server.stop());

  test('names the field that keeps it from being computed', async () => {
    const scenario = { ...sampleScenario(), ambient: 'warm' };
    const answer = await server.send('post', '/api/simulations', engineer, { scenario }).expect(400);
    expect(answer.body).toMatchObject({ code: 'invalid-input', issues: [{ path: 'scenario.ambient' }] });
  });

  test('answers with figures, traces, checks and audit as the contract says, and saves nothing', async () => {
    const answer = await server.send('post', '/api/simulations', engineer, { scenario: sampleScenario({ limits: { peakCurrent: 1 } }) }).expect(200);
    const { assessment, milliseconds } = simulatedSchema.parse(answer.body);
    expect(milliseconds).toBeGreaterThan(0);
    expect(assessment.run.figures.peakCurrent).toBeGreaterThan(1);
    expect(assessment.run.traces.waveform.time.length).toBeGreaterThan(10);
    expect(assessment.run.audit.clean).toBe(true);
    expect(assessment.verdict.status).toBe('fail');
    expect(assessment.checks.find(({ id }) => id === 'peak-current')).toMatchObject({ status: 'fail', rating: 1, value: expect.any(Number) });
    expect((await server.send('get', '/api/scenarios', engineer).expect(200)).body.scenarios).toEqual([]);
  });

  test('gives the same answer for the same scenario, whichever thread took it', async () => {
    const runs = await Promise.all([1, 2, 3].map(() => server.send('post', '/api/simulations', engineer, { scenario: sampleScenario() }).expect(200)));
    const answers = runs.map((one) => JSON.stringify(simulatedSchema.parse(one.body).assessment));
    expect(new Set(answers).size).toBe(1);
  });
});

describe('a run that does not end', () => {
  let server: ApiServer;
  let folder: string;
  beforeAll(async () => {
    server = await ApiServer.start({ simulationWorker: HELD_WORKER, simulationTimeLimit: 500 });
    folder = mkdtempSync(join(tmpdir(), 'tidegate-held-'));
  });
  afterAll(async () => {
    await server.stop();
    rmSync(folder, { recursive: true });
  });

  test('is stopped with a word on it, and its thread computes the next one', async () => {
    const designer = await server.signIn(server.people.designer);
    const held = join(folder, 'held');
    const answer = await server.send('post', '/api/simulations', designer, { scenario: sampleScenario({ notes: held }) }).expect(500);
    expect(answer.body).toMatchObject({ code: 'internal', detail: expect.stringContaining('longer than 0.5 s') });
    const free = join(folder, 'free');
    writeFileSync(`${free}.release`, '');
    const next = Array.from({ length: 4 }, () => server.send('post', '/api/simulations', designer, { scenario: sampleScenario({ notes: free }) }));
    expect((await Promise.all(next)).map(({ status }) => status)).toEqual([200, 200, 200, 200]);
  });
});

describe('while the engine is at work', () => {
  let server: ApiServer;
  let token: string;
  let folder: string;
  beforeAll(async () => {
    server = await ApiServer.start({ simulationWorker: HELD_WORKER });
    const made = await server.send('post', '/api/tokens', await server.signIn(server.people.designer), { name: 'runs' }).expect(201);
    token = String(made.body.secret);
    folder = mkdtempSync(join(tmpdir(), 'tidegate-held-'));
  });
  afterAll(async () => {
    await server.stop();
    rmSync(folder, { recursive: true });
  });

  const newNotes = () => join(folder, randomUUID());
  const begun = (notes: string): string[] => (existsSync(notes) ? readFileSync(notes, 'utf8').trim().split('\n') : []);
  const release = (notes: string) => writeFileSync(`${notes}.release`, '');
  const until = async (condition: () => boolean) => {
    while (!condition()) await wait(10);
  };
  const start = (name: string, notes: string, signal?: AbortSignal): Promise<number> =>
    fetch(`${server.url}/api/simulations`, {
      method: 'POST',
      headers: { 'content-type': 'application/json', authorization: `Bearer ${token}` },
      body: JSON.stringify({ scenario: sampleScenario({ name, notes }) }),
      ...(signal ? { signal } : {}),
    }).then((answer) => answer.status);
  const holdBothThreads = async (notes: string, signal?: AbortSignal) => {
    const runs = [start('first', notes, signal), start('second', notes, signal)];
    await until(() => begun(notes).length === 2);
    return runs;
  };

  test('other requests are answered', async () => {
    const notes = newNotes();
    let settled = 0;
    const runs = (await holdBothThreads(notes)).map((run) => run.finally(() => (settled += 1)));
    await server.send('get', '/api/health', null).expect(200);
    await server.withToken('get', '/api/scenarios', token).expect(200);
    expect(settled).toBe(0);
    release(notes);
    expect(await Promise.all(runs)).toEqual([200, 200]);
  });

  test('only so many runs wait; one more is told to come back', async () => {
    const notes = newNotes();
    const held = await holdBothThreads(notes);
    const refused: number[] = [];
    const note = (status: number) => {
      if (status !== 200) refused.push(status);
      return status;
    };
    const answers = Array.from({ length: 20 }, (_, index) => start(`waiting ${index}`, notes).then(note));
    await until(() => refused.length === 4);
    expect(refused).toEqual([503, 503, 503, 503]);
    expect(server.composed.simulations.waiting).toBe(16);
    const problem = await server.withToken('post', '/api/simulations', token, { scenario: sampleScenario({ notes }) }).expect(503);
    expect(problem.body).toMatchObject({ code: 'busy' });
    expect(problem.headers['retry-after']).toBe('2');
    release(notes);
    expect(await Promise.all(held)).toEqual([200, 200]);
    expect((await Promise.all(answers)).filter((status) => status === 200)).toHaveLength(16);
  });

  test('a run whose client hangs up while it waits never begins', async () => {
    const notes = newNotes();
    const held = await holdBothThreads(notes);
    const hangUp = new AbortController();
    const waiting = start('abandoned', notes, hangUp.signal).catch(() => 'hung up');
    await until(() => server.composed.simulations.waiting === 1);
    const later = start('later', notes);
    await until(() => server.composed.simulations.waiting === 2);
    hangUp.abort();
    expect(await waiting).toBe('hung up');
    await until(() => server.composed.simulations.waiting === 1);
    release(notes);
    await Promise.all([...held, later]);
    expect(begun(notes)).not.toContain('abandoned');
    expect(begun(notes)).toContain('later');
  });

  test('a run whose client hangs up while it computes gives its thread back', async () => {
    const notes = newNotes();
    const hangUp = new AbortController();
    const held = (await holdBothThreads(notes, hangUp.signal)).map((run) => run.catch(() => 'hung up'));
    const others = newNotes();
    release(others);
    const waiting = start('patient', others);
    hangUp.abort();
    expect(await Promise.all(held)).toEqual(['hung up', 'hung up']);
    expect(await waiting).toBe(200);
    expect(existsSync(`${notes}.release`)).toBe(false);
  });
});
