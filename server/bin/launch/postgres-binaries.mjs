import { execFileSync } from 'node:child_process';
import { existsSync, mkdirSync, readdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';

import { installPackage, isRoot } from './debian.mjs';
import { Halt } from './say.mjs';

const DEBIAN = '/usr/lib/postgresql';
const NEEDED = ['initdb', 'pg_ctl', 'postgres'];
const CREATE_CLUSTER = '/etc/postgresql-common/createcluster.conf';
const OLDEST = 14;

const versionOf = (folder) => Number(/\d+/.exec(execFileSync(path.join(folder, 'postgres'), ['--version'], { encoding: 'utf8' }))?.[0]);

/** Newest first. */
const found = () => {
  const debian = existsSync(DEBIAN) ? readdirSync(DEBIAN).map((version) => path.join(DEBIAN, version, 'bin')) : [];
  return [...debian, ...(process.env.PATH ?? '').split(':')]
    .filter((folder) => path.isAbsolute(folder) && NEEDED.every((name) => existsSync(path.join(folder, name))))
    .map((folder) => ({ folder, version: versionOf(folder) }))
    .filter(({ version }) => version >= OLDEST)
    .sort((a, b) => b.version - a.version);
};

/** Debian would start a cluster of its own on the usual port; ours is the only one that is needed. */
const installPostgres = () => {
  if (isRoot() && !existsSync(CREATE_CLUSTER)) {
    mkdirSync(path.dirname(CREATE_CLUSTER), { recursive: true });
    writeFileSync(CREATE_CLUSTER, 'create_main_cluster = false\n');
  }
  installPackage('postgresql', 'PostgreSQL is missing.');
};

/** Installs PostgreSQL where it is missing. */
export const ensurePostgres = () => {
  if (found().length === 0) installPostgres();
  if (found().length === 0) throw new Halt(`PostgreSQL ${OLDEST} or newer was not found, not even after its installation.`);
};

/**
 * @param dataFolder where data may lie already: they can only be served by the version that made them
 * @returns the folder that holds initdb, pg_ctl and postgres
 */
export const binariesFor = (dataFolder) => {
  const versions = found();
  const made = path.join(dataFolder, 'PG_VERSION');
  if (!existsSync(made)) return versions[0].folder;
  const version = Number(readFileSync(made, 'utf8'));
  const fit = versions.find((one) => one.version === version);
  if (!fit) throw new Halt(`The database in ${dataFolder} was made by PostgreSQL ${version}, which is not installed. Install postgresql-${version}, or move that folder away to begin with a new one.`);
  return fit.folder;
};
