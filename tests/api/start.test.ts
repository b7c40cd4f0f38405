import { spawn } from 'node:child_process';
import { createServer, type AddressInfo } from 'node:net';
import { join } from 'node:path';
import { Client } from 'pg';

import { DEMO_ACCOUNTS, DEMO_PASSWORD, DEMO_TEAM } from '../../server/demo/accounts';
import { createEmptyDatabase, type TestDatabase } from '../support/database';

const ROOT = join(__dirname, '..', '..');
const SECRET = 'a secret for tests, longer than 32 bytes';

const freePort = () =>
  new Promise<number>((resolve) => {
    const server = createServer().listen(0, '127.0.0.1', () => {
      const { port } = server.address() as AddressInfo;
      server.close(() => resolve(port));
    });
  });

/** The server as its own process, as it runs in earnest. */
const startProcess = (environment: Record<string, string>) => {
  const child = spawn(process.execPath, ['-r', './server/bin/typescript-hook.js', 'server/main.ts'], { cwd: ROOT, env: { ...process.env, ...environment } });
  let said = '';
  let logged = '';
  const ended = new Promise<number | null>((resolve) => child.on('close', resolve));
  const ready = new Promise<string>((resolve, reject) => {
    child.stdout.on('data', (piece: Buffer) => {
      said += piece.toString();
      if (said.includes('\n')) resolve(said);
    });
    child.on('close', () => reject(new Error(`ended before it was ready:\n${logged}`)));
  });
  child.stderr.on('data', (piece: Buffer) => (logged += piece.toString()));
  ready.catch(() => undefined);
  return { child, ready, ended, said: () => said, logged: () => logged };
};

let database: TestDatabase;
beforeEach(async () => {
  database = await createEmptyDatabase();
});
afterEach(() => database.drop());

const count = async (table: string): Promise<number> => {
  const client = new Client({ connectionString: database.url });
  await client.connect();
  const { rows } = await client.query<{ count: string }>(`SELECT count(*) FROM ${table}`);
  await client.end();
  return Number(rows[0]!.count);
};

test('it migrates, brings in the demo team once, says one line when it is ready, and ends on SIGTERM', async () => {
  const port = await freePort();
  const environment = { DATABASE_URL: database.url, PORT: String(port), SESSION_SECRET: SECRET, SEED_DEMO: '1' };
  const first = startProcess(environment);
  expect(await first.ready).toBe(`Tidegate is ready on http://127.0.0.1:${port}\n`);
  for (const { email, roles, name } of DEMO_ACCOUNTS) {
    const answer = await fetch(`http://127.0.0.1:${port}/api/session`, { method: 'POST', headers: { 'content-type': 'application/json' }, body: JSON.stringify({ email, password: DEMO_PASSWORD }) });
    const session = (await answer.json()) as { user: { name: string; roles: string[] }; team: { name: string } };
    expect(session).toMatchObject({ user: { name }, team: { name: DEMO_TEAM.name } });
    expect([...session.user.roles].sort()).toEqual([...roles].sort());
  }
  first.child.kill('SIGTERM');
  expect(await first.ended).toBe(0);
  expect(first.said().split('\n')).toHaveLength(2);
  for (const line of first.logged().trim().split('\n')) expect(() => JSON.parse(line) as unknown).not.toThrow();

  const counts = [await count('person'), await count('part'), await count('scenario')];
  const second = startProcess(environment);
  await second.ready;
  second.child.kill('SIGINT');
  expect(await second.ended).toBe(0);
  expect([await count('person'), await count('part'), await count('scenario')]).toEqual(counts);
  expect(counts[0]).toBe(DEMO_ACCOUNTS.length);
});

test('without SEED_DEMO nobody is brought in', async () => {
  const server = startProcess({ DATABASE_URL: database.url, PORT: String(await freePort()), SESSION_SECRET: SECRET });
  await server.ready;
  expect(await count('person')).toBe(0);
  server.child.kill('SIGTERM');
  await server.ended;
});

test('wrong settings are all named, and it does not start', async () => {
  const server = startProcess({ DATABASE_URL: 'mysql://127.0.0.1/x', PORT: 'eighty', SESSION_SECRET: 'short' });
  expect(await server.ended).toBe(1);
  for (const name of ['DATABASE_URL', 'PORT', 'SESSION_SECRET']) expect(server.logged()).toContain(name);
  expect(server.logged()).not.toContain('short');
  expect(server.said()).toBe('');
});

test('a taken port is told in plain words', async () => {
  const holder = createServer();
  const port = await new Promise<number>((resolve) => holder.listen(0, '127.0.0.1', () => resolve((holder.address() as AddressInfo).port)));
  const server = startProcess({ DATABASE_URL: database.url, PORT: String(port), SESSION_SECRET: SECRET });
  expect(await server.ended).toBe(1);
  expect(server.logged()).toContain('The port is taken by another program');
  await new Promise((resolve) => holder.close(resolve));
});
