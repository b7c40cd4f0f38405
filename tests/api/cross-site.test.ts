import supertest from 'supertest';

import { ApiServer, PASSWORD } from '../support/api-server';
import { sampleScenario } from '../support/sample-scenario';

let server: ApiServer;
let cookies: string;
beforeAll(async () => {
  server = await ApiServer.start();
  cookies = await server.signIn(server.people.designer);
});
afterAll(() => server.stop());

const create = (headers: Record<string, string>) => supertest(server.url).post('/api/scenarios').set(headers).send({ scenario: sampleScenario() });

test.each(['cross-site', 'same-site', 'none'])('a change that a browser marks %s is refused', async (site) => {
  const answer = await create({ Cookie: cookies, 'Sec-Fetch-Site': site }).expect(403);
  expect(answer.body).toMatchObject({ code: 'cross-site' });
});

test('a change from another origin is refused where the browser sends no mark', async () => {
  await create({ Cookie: cookies, Origin: 'https://elsewhere.example' }).expect(403);
  await create({ Cookie: cookies, Origin: 'null' }).expect(403);
});

test('a change with cookies that does not say where it comes from is refused', async () => {
  await create({ Cookie: cookies }).expect(403);
});

test('a change from the own pages is taken, by mark or by origin', async () => {
  await create({ Cookie: cookies, 'Sec-Fetch-Site': 'same-origin' }).expect(201);
  await create({ Cookie: cookies, Origin: server.url }).expect(201);
});

test('nothing was created by the refused ones', async () => {
  const answer = await server.send('get', '/api/scenarios', cookies).expect(200);
  expect(answer.body.scenarios).toHaveLength(2);
});

test('another site cannot sign its visitor in, a program without cookies can', async () => {
  const signIn = (headers: Record<string, string>) => supertest(server.url).post('/api/session').set(headers).send({ email: server.people.reviewer.email, password: PASSWORD });
  await signIn({ 'Sec-Fetch-Site': 'cross-site' }).expect(403);
  await signIn({}).expect(201);
});

test('a bearer token needs no origin, for no browser sends it by itself', async () => {
  const token = await server.send('post', '/api/tokens', cookies, { name: 'script' }).expect(201);
  await create({ Authorization: `Bearer ${String(token.body.secret)}` }).expect(201);
});
