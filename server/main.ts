import type { Server } from 'node:http';
import { setTimeout as wait } from 'node:timers/promises';
import type { Logger } from 'pino';
import type { DataSource } from 'typeorm';

import { ENGINE_VERSION } from '../simulation';
import { type Composed, compose } from './compose';
import { type Config, ConfigError, readConfig } from './config';
import { isDatabaseUnavailable } from './database/availability';
import { createDataSource } from './database/data-source';
import { migrate } from './database/migrate';
import { seedDemo } from './demo/seed';
import { compressClient } from './http/compress-client';
import { createLog } from './log';

const CONNECT_ATTEMPTS = 30;
/** Milliseconds that requests under way get to end. */
const FAREWELL = 5000;

/** A database that is started beside the server may need a moment. */
const connect = async (database: DataSource): Promise<void> => {
  for (let attempt = 1; ; attempt += 1) {
    try {
      await database.initialize();
      return;
    } catch (error) {
      if (attempt === CONNECT_ATTEMPTS || !isDatabaseUnavailable(error)) throw error;
      await wait(1000);
    }
  }
};

const listen = (composed: Composed, { host, port }: Config): Promise<Server> =>
  new Promise((resolve, reject) => {
    const server = composed.app.listen(port, host, (error?: Error) => (error ? reject(error) : resolve(server)));
  });

const closeServer = async (server: Server): Promise<void> => {
  const closed = new Promise<void>((resolve) => server.close(() => resolve()));
  server.closeIdleConnections();
  await Promise.race([closed, wait(FAREWELL, undefined, { ref: false })]);
  server.closeAllConnections();
};

/** What makes the first minutes better but must not keep anyone waiting. */
const prepareBehindTheScenes = async ({ simulations, verdicts, client }: Composed): Promise<void> => {
  await simulations.warmUp();
  await verdicts.discardOlderThan(ENGINE_VERSION);
  verdicts.wake();
  if (client) await compressClient(client);
};

const stopOnSignal = (log: Logger, stop: () => Promise<void>): void => {
  let stopping = false;
  const onSignal = async (signal: string): Promise<void> => {
    if (stopping) return;
    stopping = true;
    log.info({ signal }, 'stopping');
    await stop();
    process.exit(0);
  };
  for (const signal of ['SIGINT', 'SIGTERM'] as const) process.on(signal, () => void onSignal(signal));
};

const start = async (config: Config): Promise<void> => {
  const log = createLog(config.logLevel);
  const database = createDataSource(config.databaseUrl, log);
  await connect(database);
  await migrate(database);
  const composed = compose({ database, sessionSecret: config.sessionSecret, staticDir: config.staticDir, log });
  if (config.seedDemo) await seedDemo(database, composed.passwords);
  const server = await listen(composed, config);
  stopOnSignal(log, async () => {
    await closeServer(server);
    await composed.close();
    await database.destroy();
  });
  process.stdout.write(`Tidegate is ready on http://${config.host}:${config.port}\n`);
  prepareBehindTheScenes(composed).catch((error: unknown) => log.error({ err: error }, 'preparing failed'));
};

const explain = (error: unknown): string => {
  if (error instanceof ConfigError) return error.message;
  if (isDatabaseUnavailable(error)) return 'The database at DATABASE_URL cannot be reached. Start it, or correct the address.';
  if (error instanceof Error && 'code' in error && error.code === 'EADDRINUSE') return 'The port is taken by another program. Stop it, or set PORT to a free one.';
  return error instanceof Error ? (error.stack ?? error.message) : String(error);
};

const main = async (): Promise<void> => {
  try {
    await start(readConfig(process.env));
  } catch (error) {
    process.stderr.write(`${explain(error)}\n`);
    process.exit(1);
  }
};

void main();
