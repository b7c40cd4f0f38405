import { createdTokenSchema, tokenListSchema } from '../../shared/contracts/session';
import { ApiServer } from '../support/api-server';

const DAY = 86_400_000;

let server: ApiServer;
beforeAll(async () => {
  server = await ApiServer.start();
});
afterAll(() => server.stop());

const create = async (cookies: string, days = 90) =>
  createdTokenSchema.parse((await server.send('post', '/api/tokens', cookies, { name: 'bench script', days }).expect(201)).body);
const list = async (cookies: string) => tokenListSchema.parse((await server.send('get', '/api/tokens', cookies).expect(200)).body).tokens;

test('a token is not made without a name, nor for longer than a year', async () => {
  const cookies = await server.signIn(server.people.designer);
  const answer = await server.send('post', '/api/tokens', cookies, { name: ' ', days: 366 }).expect(400);
  expect(answer.body).toMatchObject({ issues: [{ path: 'name' }, { path: 'days' }] });
});

test('a token acts as the person who made it, and its use is noted', async () => {
  const cookies = await server.signIn(server.people.designer);
  const token = await create(cookies);
  const answer = await server.withToken('get', '/api/session', token.secret).expect(200);
  expect(answer.body).toMatchObject({ user: { id: server.people.designer.id } });
  expect(answer.headers['set-cookie']).toBeUndefined();
  const listed = (await list(cookies)).find(({ id }) => id === token.id);
  expect(listed?.lastUsedAt).not.toBeNull();
});

test('the secret is shown once and kept only as a hash', async () => {
  const cookies = await server.signIn(server.people.reviewer);
  const { secret } = await create(cookies);
  const listed = await server.send('get', '/api/tokens', cookies).expect(200);
  expect(JSON.stringify(listed.body)).not.toContain(secret);
  const kept: unknown = await server.database.query('SELECT * FROM api_token');
  expect(JSON.stringify(kept)).not.toContain(secret);
});

test('a revoked token opens nothing at the next request, and leaves the list', async () => {
  const cookies = await server.signIn(server.people.designer);
  const token = await create(cookies);
  await server.send('delete', `/api/tokens/${token.id}`, cookies).expect(204);
  await server.withToken('get', '/api/session', token.secret).expect(401);
  expect((await list(cookies)).map(({ id }) => id)).not.toContain(token.id);
  await server.send('delete', `/api/tokens/${token.id}`, cookies).expect(404);
});

test("nobody sees or revokes another's token", async () => {
  const token = await create(await server.signIn(server.people.designer));
  const other = await server.signIn(server.people.librarian);
  expect(await list(other)).toEqual([]);
  await server.send('delete', `/api/tokens/${token.id}`, other).expect(404);
  await server.withToken('get', '/api/session', token.secret).expect(200);
});

test('a token expires', async () => {
  const cookies = await server.signIn(server.people.admin);
  const token = await create(cookies, 1);
  server.wait(DAY);
  await server.withToken('get', '/api/session', token.secret).expect(401);
});

test.each(['Bearer', 'Bearer unknown', 'Basic c29tZTpib2R5', 'Bearer a b'])('the header "%s" is refused, whatever cookies come with it', async (header) => {
  const cookies = await server.signIn(server.people.designer);
  const answer = await server.send('get', '/api/session', cookies).set('Authorization', header).expect(401);
  expect(answer.headers['www-authenticate']).toMatch(/^Bearer/);
});
