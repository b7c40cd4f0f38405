import { type AddressInfo, connect as connectTcp, createServer, type Server, type Socket } from 'node:net';

import { ApiServer } from '../support/api-server';
import { sampleScenario } from '../support/sample-scenario';

/** Stands between server and database, and can be cut like a cable. */
class Cable {
  private readonly sockets = new Set<Socket>();
  private server: Server | null = null;
  port = 0;

  constructor(private readonly target: { host: string; port: number }) {}

  async plug(): Promise<void> {
    const server = createServer((near) => {
      const far = connectTcp(this.target);
      for (const socket of [near, far]) {
        this.sockets.add(socket);
        socket.on('error', () => socket.destroy()).on('close', () => this.sockets.delete(socket));
      }
      near.pipe(far).pipe(near);
    });
    await new Promise<void>((resolve) => server.listen(this.port, '127.0.0.1', resolve));
    this.port = (server.address() as AddressInfo).port;
    this.server = server;
  }

  async cut(): Promise<void> {
    const closed = new Promise((resolve) => this.server?.close(resolve));
    for (const socket of this.sockets) socket.destroy();
    await closed;
  }
}

let cable: Cable;
let server: ApiServer;
let designer: string;
beforeAll(async () => {
  server = await ApiServer.start({
    throughCable: async (direct) => {
      const address = new URL(direct);
      cable = new Cable({ host: address.hostname, port: Number(address.port) });
      await cable.plug();
      address.hostname = '127.0.0.1';
      address.port = String(cable.port);
      return address.href;
    },
  });
  designer = await server.signIn(server.people.designer);
});
afterAll(async () => {
  await server.stop();
  await cable.cut();
});

test('with the database away every request says so, and with the database back the server goes on by itself', async () => {
  const { id } = (await server.send('post', '/api/scenarios', designer, { scenario: sampleScenario({ name: 'Before' }) }).expect(201)).body as { id: string };
  await server.composed.verdicts.settled();
  await cable.cut();
  for (const [method, path, body] of [
    ['get', '/api/health', undefined],
    ['get', '/api/scenarios', undefined],
    ['put', `/api/scenarios/${id}`, { version: 1, scenario: sampleScenario({ name: 'Lost' }) }],
    ['post', '/api/session', { email: server.people.designer.email, password: 'any' }],
  ] as const) {
    const answer = await server.send(method, path, designer, body).expect(503);
    expect(answer.body).toMatchObject({ code: 'database-unavailable' });
    expect(answer.headers['retry-after']).toBe('2');
  }
  await server.send('get', '/api/openapi.json', null).expect(200);

  await cable.plug();
  await server.send('get', '/api/health', null).expect(200);
  const after = await server.send('get', `/api/scenarios/${id}`, designer).expect(200);
  expect(after.body).toMatchObject({ name: 'Before', version: 1 });
});

test('connections that the database ends are replaced unnoticed', async () => {
  await Promise.all(Array.from({ length: 5 }, () => server.send('get', '/api/scenarios', designer).expect(200)));
  await server.database.query('SELECT pg_terminate_backend(pid) FROM pg_stat_activity WHERE datname = current_database() AND pid <> pg_backend_pid()');
  await server.send('get', '/api/scenarios', designer).expect(200);
});

test('a verdict that was due while the database was away is computed afterwards', async () => {
  const { id } = (await server.send('post', '/api/scenarios', designer, { scenario: sampleScenario() }).expect(201)).body as { id: string };
  await cable.cut();
  server.composed.verdicts.wake();
  await server.send('get', '/api/health', null).expect(503);
  await cable.plug();
  await server.composed.verdicts.settled();
  const record = await server.send('get', `/api/scenarios/${id}`, designer).expect(200);
  expect((record.body as { verdict: unknown }).verdict).not.toBeNull();
});
