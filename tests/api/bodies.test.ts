import { gzipSync } from 'node:zlib';

import { DEPTH_LIMIT } from '../../server/http/json-body';
import { ApiServer } from '../support/api-server';
import { sampleScenario } from '../support/sample-scenario';

let server: ApiServer;
let designer: string;
beforeAll(async () => {
  server = await ApiServer.start();
  designer = await server.signIn(server.people.designer);
});
afterAll(() => server.stop());

const post = (body: string | Buffer, headers: Record<string, string> = {}) =>
  server.send('post', '/api/scenarios', designer).set({ 'Content-Type': 'application/json', ...headers }).send(body);
const nested = (depth: number) => `${'['.repeat(depth)}${']'.repeat(depth)}`;

test.each([
  ['cut off', '{"scenario": {'],
  ['with a trailing comma', '{"scenario": 1,}'],
  ['not an object or a list', '"scenario"'],
  ['holding NaN', '{"scenario": NaN}'],
  ['nested too deep', `{"scenario": ${nested(DEPTH_LIMIT)}}`],
  ['nested a hundred thousand deep', nested(100_000)],
])('a body %s is malformed', async (_what, body) => {
  const answer = await post(body).expect(400);
  expect(answer.body).toMatchObject({ code: 'malformed-body', status: 400 });
  expect(answer.headers['content-type']).toMatch(/^application\/problem\+json/);
});

test.each([
  ['U+0000', 'name', { name: 'a\0b' }],
  ['half a character', 'notes', { notes: '\ud83d' }],
])('text that the database cannot hold is refused with the field named: %s', async (_what, field, wrong) => {
  const answer = await post(JSON.stringify({ scenario: sampleScenario(wrong) })).expect(400);
  expect(answer.body).toMatchObject({ code: 'invalid-input', issues: [{ path: `scenario.${field}` }] });
});

test('brackets inside text do not count as depth', async () => {
  await post(JSON.stringify({ scenario: sampleScenario({ notes: `${'['.repeat(200)} \\" ${'{'.repeat(200)}` }) })).expect(201);
});

test('a body of 257 kB is too large', async () => {
  const answer = await post(JSON.stringify({ scenario: sampleScenario(), filler: 'x'.repeat(257 * 1024) })).expect(413);
  expect(answer.body).toMatchObject({ code: 'body-too-large' });
});

test.each([
  ['of another type', { 'Content-Type': 'text/plain' }],
  ['of a form', { 'Content-Type': 'application/x-www-form-urlencoded' }],
  ['in another encoding', { 'Content-Type': 'application/json; charset=koi8-r' }],
])('a body %s is not taken', async (_what, headers) => {
  const answer = await post('{}', headers).expect(415);
  expect(answer.body).toMatchObject({ code: 'unsupported-media' });
});

test('a compressed body is not taken, so that it cannot swell', async () => {
  const answer = await server
    .send('post', '/api/scenarios', designer)
    .set({ 'Content-Type': 'application/json', 'Content-Encoding': 'gzip' })
    .serialize((body: unknown) => body as string)
    .send(gzipSync(Buffer.alloc(10_000_000, ' ')));
  expect(answer.status).toBe(415);
});

test('no body at all is named as a missing one', async () => {
  const answer = await server.send('post', '/api/scenarios', designer).expect(400);
  expect(answer.body).toMatchObject({ code: 'invalid-input', issues: [{ path: '', message: 'is missing' }] });
});

test.each(['__proto__', 'constructor', 'prototype'])('the key %s is refused like any other unknown one', async (key) => {
  const scenario = JSON.stringify(sampleScenario());
  const answer = await post(`{"scenario": ${scenario.slice(0, -1)}, "${key}": {"polluted": true}}}`).expect(400);
  expect(answer.body).toMatchObject({ code: 'invalid-input' });
  expect(({} as { polluted?: boolean }).polluted).toBeUndefined();
});

test('numbers beyond what a double holds are refused with the field named', async () => {
  const scenario = JSON.stringify(sampleScenario({ duration: 12345 }));
  const answer = await post(`{"scenario": ${scenario.replace('12345', '1e309')}}`).expect(400);
  expect(answer.body).toMatchObject({ code: 'invalid-input', issues: [{ path: 'scenario.duration' }] });
});

test('a search for U+0000 is refused, not passed on to the database', async () => {
  const answer = await server.send('get', '/api/parts?search=a%00b', designer).expect(400);
  expect(answer.body).toMatchObject({ code: 'invalid-input', issues: [{ path: 'search' }] });
});
