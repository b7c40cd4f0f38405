import { execFileSync, spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { chownSync, existsSync, mkdirSync, statSync } from 'node:fs';
import path from 'node:path';

import { isRoot } from './debian.mjs';
import { ROOT } from './paths.mjs';
import { Halt } from './say.mjs';

const number = (flag) => Number(execFileSync('id', [flag, 'postgres'], { encoding: 'utf8' }));

const canEnter = (folder, owner) => spawnSync('/bin/sh', ['-c', 'cd "$1"', 'sh', folder], { ...owner, cwd: '/', stdio: 'ignore' }).status === 0;

const ownFolder = (folder, owner) => {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  chownSync(folder, owner.uid, owner.gid);
};

/**
 * PostgreSQL refuses to run as root: root hands it to the user `postgres`, anybody else runs it as himself.
 *
 * @param wanted the folder for the cluster and its log, inside the project
 * @returns the folder to take, and uid and gid for `spawn`
 */
export const settleOwner = (wanted) => {
  if (!isRoot()) {
    mkdirSync(wanted, { recursive: true, mode: 0o700 });
    if (statSync(wanted).uid !== process.getuid()) throw new Halt(`The database in ${wanted} belongs to another user. Start as that user, or move the folder away to begin with a new one.`);
    return { folder: wanted, owner: {} };
  }
  const present = existsSync(wanted) ? statSync(wanted) : null;
  const owner = present && present.uid !== 0 ? { uid: present.uid, gid: present.gid } : { uid: number('-u'), gid: number('-g') };
  mkdirSync(path.dirname(wanted), { recursive: true, mode: 0o711 });
  if (canEnter(path.dirname(wanted), owner)) {
    ownFolder(wanted, owner);
    return { folder: wanted, owner };
  }
  const hash = createHash('sha256').update(ROOT).digest('hex').slice(0, 12);
  const elsewhere = `/var/lib/tidegate-${hash}/${path.basename(wanted)}`;
  mkdirSync(path.dirname(elsewhere), { recursive: true, mode: 0o711 });
  ownFolder(elsewhere, owner);
  return { folder: elsewhere, owner };
};
