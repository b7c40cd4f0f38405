/**
 * `npm start`: makes what is missing, then keeps database and server running until it is stopped.
 * Everything up to the installation of the packages is plain Node.
 */
import { existsSync } from 'node:fs';
import { createRequire } from 'node:module';
import path from 'node:path';

import { CLIENT, ensureClient } from './launch/client-build.mjs';
import { watchDatabase } from './launch/database-watch.mjs';
import { ensurePackages } from './launch/npm-packages.mjs';
import { ROOT, local, makeLocal } from './launch/paths.mjs';
import { PostgresCluster } from './launch/postgres-cluster.mjs';
import { Halt, say, seconds } from './launch/say.mjs';
import { readSecrets } from './launch/secrets.mjs';
import { ServerProcess } from './launch/server-process.mjs';
import { readServerMark, takeLock } from './launch/start-lock.mjs';
import { StopSwitch } from './launch/stop-switch.mjs';

const WEB_PORT = 4173;
const DATABASE_PORT = 54_173;
const DATABASE = 'tidegate';

/** Left blank in .env, a setting counts as not made. */
const SETTINGS = ['DATABASE_URL', 'HOST', 'PORT', 'SESSION_SECRET', 'SEED_DEMO', 'LOG_LEVEL'];

const stopSwitch = new StopSwitch();

const readSettings = () => {
  const file = path.join(ROOT, '.env');
  if (existsSync(file)) process.loadEnvFile(file);
  for (const name of SETTINGS) if (process.env[name] === '') delete process.env[name];
  if (process.env.PORT && !/^\d{1,5}$/.test(process.env.PORT)) throw new Halt(`PORT must be a number, not ${process.env.PORT}. Correct it in .env.`);
};

/** @returns the address of the project's own database; one that the settings name is left to its owner */
const startDatabase = async (secrets) => {
  if (process.env.DATABASE_URL) return process.env.DATABASE_URL;
  const cluster = new PostgresCluster({ wanted: local('postgres'), port: DATABASE_PORT, passwords: secrets });
  stopSwitch.cluster = cluster;
  await cluster.open();
  void watchDatabase(cluster, () => stopSwitch.stopping);
  await cluster.createDatabase(DATABASE);
  return cluster.url(DATABASE);
};

const startServer = async (databaseUrl, secrets) => {
  const settings = { HOST: '127.0.0.1', SESSION_SECRET: secrets.session, SEED_DEMO: '1', NODE_ENV: 'production' };
  const server = new ServerProcess({
    port: Number(process.env.PORT ?? WEB_PORT),
    fixed: Boolean(process.env.PORT),
    env: { ...settings, ...process.env, DATABASE_URL: databaseUrl, STATIC_DIR: CLIENT },
    announce: (address) => say('open', address),
  });
  stopSwitch.server = server;
  await server.start();
  return server;
};

const showSignIns = () => {
  if (process.env.SEED_DEMO === '0') return;
  const require = createRequire(import.meta.url);
  require('./typescript-hook.js');
  const { DEMO_ACCOUNTS, DEMO_PASSWORD } = require('../demo/accounts.ts');
  say('sign in', `as one of these, with the password ${DEMO_PASSWORD}`);
  for (const { email, roles } of DEMO_ACCOUNTS) say('', `${email.padEnd(28)} ${roles.join(', ')}`);
};

const start = async () => {
  const began = Date.now();
  readSettings();
  makeLocal();
  const holder = takeLock();
  if (holder) {
    say('start', `Tidegate runs already on ${readServerMark()?.address ?? 'this machine'} (process ${holder.pid})`);
    return;
  }
  stopSwitch.arm();
  await ensurePackages();
  const secrets = readSecrets();
  const databaseUrl = await startDatabase(secrets);
  await ensureClient();
  const server = await startServer(databaseUrl, secrets);
  say('log', path.relative(process.cwd(), local('server.log')));
  showSignIns();
  say('open', `${server.address}   (after ${seconds(began)}; Ctrl-C stops it)`);
};

try {
  await start();
} catch (error) {
  if (stopSwitch.stopping) await new Promise(() => {});
  console.error(error instanceof Halt ? `\n${error.message}` : error);
  await stopSwitch.stop('giving up', 1);
}
