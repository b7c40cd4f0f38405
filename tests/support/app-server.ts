import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { createServer, type AddressInfo } from 'node:net';
import path from 'node:path';

import { createEmptyDatabase } from './database';

const ROOT = path.resolve(__dirname, '../..');
const CLIENT = path.join(ROOT, 'dist');
const START_MS = 60_000;
const ASK_EVERY_MS = 150;

export interface AppServer {
  url: string;
  stop: () => Promise<void>;
}

const freePort = () =>
  new Promise<number>((resolve) => {
    const probe = createServer().listen(0, '127.0.0.1', () => {
      const { port } = probe.address() as AddressInfo;
      probe.close(() => resolve(port));
    });
  });

const answers = async (url: string) => {
  try {
    return (await fetch(`${url}/api/health`)).ok;
  } catch {
    return false;
  }
};

/** The whole product as it is served: built client, API and worker threads in a process of their own, on a seeded database of its own. */
export const startApp = async (): Promise<AppServer> => {
  const running = process.env.E2E_ADDRESS;
  if (running) return { url: running, stop: async () => undefined };
  if (!existsSync(path.join(CLIENT, 'index.html'))) throw new Error('The client is not built: run `npm run build` first.');
  const database = await createEmptyDatabase();
  const port = await freePort();
  const url = `http://127.0.0.1:${port}`;
  const child = spawn(process.execPath, ['-r', './server/bin/typescript-hook.js', 'server/main.ts'], {
    cwd: ROOT,
    env: { ...process.env, DATABASE_URL: database.url, PORT: String(port), SESSION_SECRET: 's'.repeat(32), STATIC_DIR: CLIENT, SEED_DEMO: '1', LOG_LEVEL: 'error' },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  let said = '';
  for (const stream of [child.stdout, child.stderr]) stream.on('data', (chunk) => (said = `${said}${String(chunk)}`.slice(-4000)));
  const ended = new Promise<void>((resolve) => child.once('exit', () => resolve()));
  const stop = async () => {
    child.kill('SIGTERM');
    await ended;
    await database.drop();
  };
  const deadline = Date.now() + START_MS;
  while (!(await answers(url))) {
    if (child.exitCode !== null || Date.now() > deadline) {
      await stop();
      throw new Error(`The server did not start:\n${said}`);
    }
    await new Promise((resolve) => setTimeout(resolve, ASK_EVERY_MS));
  }
  return { url, stop };
};
