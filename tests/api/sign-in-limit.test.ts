import { request as httpRequest } from 'node:http';

import { ApiServer, PASSWORD, type TestPerson } from '../support/api-server';

let server: ApiServer;
beforeAll(async () => {
  server = await ApiServer.start();
});
afterAll(() => server.stop());

interface Attempt {
  status: number;
  code: string | undefined;
  retryAfter: number | null;
}

/** A sign-in that comes from an address of the test's choice; all of 127.0.0.0/8 is this machine. */
const attempt = (email: string, password: string, from: string): Promise<Attempt> =>
  new Promise((resolve, reject) => {
    const sent = httpRequest(`${server.url}/api/session`, { method: 'POST', localAddress: from, headers: { 'content-type': 'application/json' } }, (answer) => {
      let text = '';
      answer.on('data', (piece: Buffer) => (text += piece.toString()));
      answer.on('end', () => {
        const retry = answer.headers['retry-after'];
        resolve({ status: answer.statusCode ?? 0, code: (JSON.parse(text) as { code?: string }).code, retryAfter: retry === undefined ? null : Number(retry) });
      });
    });
    sent.on('error', reject);
    sent.end(JSON.stringify({ email, password }));
  });

const failTenTimes = async (email: string, from: string): Promise<void> => {
  for (let count = 0; count < 10; count += 1) expect(await attempt(email, 'a guess', from)).toMatchObject({ status: 401 });
};

const letPausesPass = () => server.database.query(`UPDATE sign_in_attempt SET expire = 0 WHERE key LIKE 'pause%'`);

test('after ten failures an account rests for that address, also for the right password; the owner elsewhere still gets in', async () => {
  const owner: TestPerson = server.people.designer;
  await failTenTimes(owner.email, '127.0.0.11');
  const refused = await attempt(owner.email, PASSWORD, '127.0.0.11');
  expect(refused).toMatchObject({ status: 429, code: 'too-many-attempts' });
  expect(refused.retryAfter).toBeGreaterThan(0);
  expect(refused.retryAfter).toBeLessThanOrEqual(30);
  expect(await attempt(owner.email, PASSWORD, '127.0.0.12')).toMatchObject({ status: 201 });
});

test('the wait doubles with every further failure', async () => {
  const { email } = server.people.librarian;
  await failTenTimes(email, '127.0.0.13');
  await letPausesPass();
  expect(await attempt(email, 'a guess', '127.0.0.13')).toMatchObject({ status: 401 });
  const refused = await attempt(email, 'a guess', '127.0.0.13');
  expect(refused.status).toBe(429);
  expect(refused.retryAfter).toBeGreaterThan(30);
  expect(refused.retryAfter).toBeLessThanOrEqual(60);
});

test('signing in wipes the slate', async () => {
  const { email } = server.people.reviewer;
  await failTenTimes(email, '127.0.0.14');
  await letPausesPass();
  expect(await attempt(email, PASSWORD, '127.0.0.14')).toMatchObject({ status: 201 });
  expect(await attempt(email, 'a guess', '127.0.0.14')).toMatchObject({ status: 401 });
  expect(await attempt(email, PASSWORD, '127.0.0.14')).toMatchObject({ status: 201 });
});

test('an unknown account is limited like a known one, so that the limit tells nothing', async () => {
  await failTenTimes('nobody@test.example', '127.0.0.15');
  expect(await attempt('nobody@test.example', 'a guess', '127.0.0.15')).toMatchObject({ status: 429, code: 'too-many-attempts' });
});

test('attempts sent all at once count one by one', async () => {
  const { email } = server.people.admin;
  const answers = await Promise.all(Array.from({ length: 25 }, () => attempt(email, 'a guess', '127.0.0.16')));
  expect(answers.filter(({ status }) => status === 401)).toHaveLength(10);
  expect(answers.filter(({ status }) => status === 429)).toHaveLength(15);
});
