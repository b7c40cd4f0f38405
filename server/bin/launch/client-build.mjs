import { createHash } from 'node:crypto';
import { existsSync, mkdirSync, readdirSync, readFileSync, renameSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';

import { runChild } from './children.mjs';
import { ROOT, local, makeLocal } from './paths.mjs';
import { Halt, say, seconds } from './say.mjs';

const SOURCES = ['app', 'components', 'hooks', 'shared', 'assets', 'app.json', 'metro.config.js', 'babel.config.js', 'tsconfig.json', 'package-lock.json'];
const MARK = '.built-from';

export const CLIENT = path.join(ROOT, 'dist');

const filesBelow = (name) => {
  const full = path.join(ROOT, name);
  if (!existsSync(full)) return [];
  const entries = readdirSync(full, { withFileTypes: true, recursive: true });
  return entries.filter((entry) => entry.isFile()).map((entry) => path.relative(ROOT, path.join(entry.parentPath, entry.name))).sort();
};

const sourceHash = () => {
  const hash = createHash('sha256');
  for (const source of SOURCES) {
    const files = source.includes('.') ? [source].filter((name) => existsSync(path.join(ROOT, name))) : filesBelow(source);
    for (const file of files) hash.update(`${file}\0`).update(readFileSync(path.join(ROOT, file))).update('\0');
  }
  return hash.digest('hex');
};

const isCurrent = (wanted) => existsSync(path.join(CLIENT, MARK)) && readFileSync(path.join(CLIENT, MARK), 'utf8') === wanted;

/** The old build serves until the new one is whole. */
const replaceBuild = (made) => {
  const old = `${made}.old`;
  if (existsSync(CLIENT)) renameSync(CLIENT, old);
  renameSync(made, CLIENT);
  rmSync(old, { recursive: true, force: true });
};

const exportTo = async (folder, log) => {
  const cache = local('cache');
  mkdirSync(cache, { recursive: true });
  // The bundler keeps its cache in the temporary folder; there one user's would bar another's.
  const env = { ...process.env, EXPO_OFFLINE: '1', EXPO_NO_TELEMETRY: '1', CI: '1', NODE_ENV: 'production', TMPDIR: cache };
  const heartbeat = setInterval(() => say('client', 'still building'), 20_000);
  try {
    return await runChild(process.execPath, [path.join(ROOT, 'node_modules/expo/bin/cli'), 'export', '--platform', 'web', '--output-dir', folder], { cwd: ROOT, env, log });
  } finally {
    clearInterval(heartbeat);
  }
};

/** Builds the client into dist where its sources have changed since. */
export const ensureClient = async () => {
  const wanted = sourceHash();
  if (isCurrent(wanted)) return;
  makeLocal();
  const began = Date.now();
  const folder = local(`client-${process.pid}`);
  const log = local('client-build.log');
  say('client', 'building; the first time this takes about two minutes');
  rmSync(folder, { recursive: true, force: true });
  const status = await exportTo(folder, log);
  if (status !== 0) {
    rmSync(folder, { recursive: true, force: true });
    throw new Halt(`The client could not be built. The end of ${log}:\n${readFileSync(log, 'utf8').trim().split('\n').slice(-25).join('\n')}`);
  }
  writeFileSync(path.join(folder, MARK), wanted);
  replaceBuild(folder);
  say('client', `built in ${seconds(began)}`);
};
