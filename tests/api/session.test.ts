import { createHash } from 'node:crypto';
import jwt from 'jsonwebtoken';

import { sessionSchema } from '../../shared/contracts/session';
import { RefreshToken } from '../../server/sessions/refresh-token-entity';
import { SessionRow } from '../../server/sessions/session-entity';
import { ApiServer, cookiesOf, only, PASSWORD, type TestPerson } from '../support/api-server';

const MINUTE = 60_000;
const HOUR = 60 * MINUTE;

let server: ApiServer;
let person: TestPerson;
beforeAll(async () => {
  server = await ApiServer.start();
  person = server.people.designer;
});
afterAll(() => server.stop());

const read = (cookies: string) => server.send('get', '/api/session', cookies);
const sessionIdOf = (cookies: string): string => (jwt.decode(only(cookies, 'access').split('=')[1]!) as { sid: string }).sid;
const sessionRow = (cookies: string) => server.database.getRepository(SessionRow).findOneByOrFail({ id: sessionIdOf(cookies) });

describe('signing in', () => {
  test('wants an e-mail address and a password', async () => {
    const answer = await server.send('post', '/api/session', null, { email: 'somebody' }).expect(400);
    expect(answer.body).toMatchObject({ code: 'invalid-input', issues: [{ path: 'email' }, { path: 'password', message: 'is missing' }] });
  });

  test('tells who signed in, and sets cookies that scripts and other sites cannot use', async () => {
    const answer = await server.send('post', '/api/session', null, { email: person.email.toUpperCase(), password: PASSWORD }).expect(201);
    expect(sessionSchema.parse(answer.body)).toMatchObject({ user: { email: person.email, roles: ['designer'], initials: 'HD' }, team: { name: 'Home' } });
    const cookies = answer.headers['set-cookie'] as unknown as string[];
    expect(cookies).toHaveLength(2);
    for (const cookie of cookies) {
      expect(cookie).toMatch(/^__Host-tidegate-(access|refresh)=/);
      for (const attribute of ['HttpOnly', 'Secure', 'SameSite=Strict', 'Path=/']) expect(cookie.split('; ')).toContain(attribute);
    }
  });

  test('answers a wrong password, an unknown account and a deactivated one with the same words', async () => {
    const attempt = (email: string, password: string) => server.send('post', '/api/session', null, { email, password }).expect(401);
    await server.database.query('UPDATE person SET active = false WHERE id = $1', [server.people.reviewer.id]);
    const answers = [await attempt(person.email, 'not the password'), await attempt('nobody@test.example', PASSWORD), await attempt(server.people.reviewer.email, PASSWORD)];
    const problems = answers.map((answer) => ({ ...(answer.body as object), instance: null }));
    expect(problems[0]).toMatchObject({ code: 'wrong-credentials' });
    expect(problems[1]).toEqual(problems[0]);
    expect(problems[2]).toEqual(problems[0]);
  });

  test('keeps refresh tokens as hashes only', async () => {
    const cookies = await server.signIn(person);
    const token = only(cookies, 'refresh').split('=')[1]!;
    const rows = await server.database.getRepository(RefreshToken).findBy({ sessionId: sessionIdOf(cookies) });
    expect(rows.map((row) => row.hash)).toEqual([createHash('sha256').update(token).digest('hex')]);
  });

  test('ends the session that the browser had before', async () => {
    const before = await server.signIn(person);
    const again = await server.send('post', '/api/session', before, { email: person.email, password: PASSWORD }).expect(201);
    await read(before).expect(401);
    await read(cookiesOf(again.headers)).expect(200);
    expect((await sessionRow(before)).endedBecause).toBe('replaced');
  });

  test('that fails leaves the session alone that the browser has', async () => {
    const before = await server.signIn(person);
    server.wait(11 * MINUTE);
    await server.send('post', '/api/session', before, { email: person.email, password: 'not the password' }).expect(401);
    server.wait(MINUTE);
    await read(before).expect(200);
  });

  test('reads a password beyond 72 bytes to its end', async () => {
    const long = 'x'.repeat(80);
    await server.database.query('UPDATE person SET password_hash = $2 WHERE id = $1', [server.people.librarian.id, await server.composed.passwords.hash(`${long}1`)]);
    await server.send('post', '/api/session', null, { email: server.people.librarian.email, password: `${long}2` }).expect(401);
    await server.send('post', '/api/session', null, { email: server.people.librarian.email, password: `${long}1` }).expect(201);
  });
});

describe('a session', () => {
  test('goes on without the client noticing when the access token has expired', async () => {
    const cookies = await server.signIn(person);
    server.wait(11 * MINUTE);
    const answer = await read(cookies).expect(200);
    const renewed = cookiesOf(answer.headers);
    expect(only(renewed, 'refresh')).not.toBe(only(cookies, 'refresh'));
    const quiet = await read(renewed).expect(200);
    expect(quiet.headers['set-cookie']).toBeUndefined();
    expect(sessionIdOf(renewed)).toBe(sessionIdOf(cookies));
  });

  test('serves requests that left together with the same refresh token, and hands out one successor', async () => {
    const refresh = only(await server.signIn(person), 'refresh');
    const answers = await Promise.all(Array.from({ length: 6 }, () => read(refresh).expect(200)));
    const successors = answers.map((answer) => only(cookiesOf(answer.headers), 'refresh')).filter(Boolean);
    expect(successors).toHaveLength(1);
    expect(answers.every((answer) => only(cookiesOf(answer.headers), 'access') !== '')).toBe(true);
  });

  test('ends, with all its tokens, when a used refresh token comes back after the grace', async () => {
    const stolen = only(await server.signIn(person), 'refresh');
    const renewed = cookiesOf((await read(stolen).expect(200)).headers);
    server.wait(11_000);
    await read(renewed).expect(200);
    const refused = await read(stolen).expect(401);
    expect(cookiesOf(refused.headers)).toBe('');
    await read(renewed).expect(401);
    await read(only(renewed, 'refresh')).expect(401);
    expect((await sessionRow(renewed)).endedBecause).toBe('token-reused');
  });

  test('is over after 30 minutes without a request, however often it was renewed before', async () => {
    let cookies = await server.signIn(person);
    for (let round = 0; round < 3; round += 1) {
      server.wait(29 * MINUTE);
      cookies = cookiesOf((await read(cookies).expect(200)).headers);
    }
    server.wait(31 * MINUTE);
    await read(cookies).expect(401);
    expect((await sessionRow(cookies)).endedBecause).toBe('idle');
  });

  test('counts use under a good access token as a sign of life', async () => {
    const cookies = await server.signIn(person);
    server.wait(9 * MINUTE);
    await read(cookies).expect(200);
    server.wait(29 * MINUTE);
    await read(cookies).expect(200);
  });

  test('is over after 12 hours, however busy', async () => {
    let cookies = await server.signIn(person);
    for (let passed = 0; passed < 12 * HOUR - 25 * MINUTE; passed += 25 * MINUTE) {
      server.wait(25 * MINUTE);
      cookies = cookiesOf((await read(cookies).expect(200)).headers);
    }
    server.wait(25 * MINUTE);
    await read(cookies).expect(401);
  });

  test('is over at the next request after signing out, also for a copy of its cookies', async () => {
    const cookies = await server.signIn(person);
    const answer = await server.send('delete', '/api/session', cookies).expect(204);
    expect(cookiesOf(answer.headers)).toBe('');
    await read(cookies).expect(401);
    await read(only(cookies, 'refresh')).expect(401);
  });

  test('sees a role taken away at the next request', async () => {
    const cookies = await server.signIn(server.people.admin);
    await server.database.query(`UPDATE role_grant SET role = 'reviewer' WHERE person_id = $1`, [server.people.admin.id]);
    expect((await read(cookies).expect(200)).body).toMatchObject({ user: { roles: ['reviewer'] } });
  });
});

describe('a forged access token', () => {
  const access = (token: string) => `__Host-tidegate-access=${token}`;
  const payload = async () => ({ sid: sessionIdOf(await server.signIn(person)), iss: 'tidegate', exp: Math.floor(Date.now() / 1000) + 10 ** 7 });

  test('signed with another secret is refused', async () => {
    await read(access(jwt.sign(await payload(), 'another secret of enough length 12345'))).expect(401);
  });

  test('without a signature is refused', async () => {
    await read(access(jwt.sign(await payload(), '', { algorithm: 'none' }))).expect(401);
  });
});
