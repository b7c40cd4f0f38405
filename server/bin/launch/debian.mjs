import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';

import { Halt, say } from './say.mjs';

export const isRoot = () => process.getuid?.() === 0;

const apt = (args) => {
  const { status, stderr, error } = spawnSync('apt-get', args, {
    env: { ...process.env, DEBIAN_FRONTEND: 'noninteractive' },
    encoding: 'utf8',
    stdio: ['ignore', 'ignore', 'pipe'],
  });
  if (status !== 0) throw new Halt(`apt-get ${args.join(' ')} failed:\n${(stderr ?? String(error)).trim().split('\n').slice(-5).join('\n')}`);
};

/** As root installs a Debian package; for an ordinary user says which command does, and gives up. */
export const installPackage = (name, reason) => {
  if (!existsSync('/usr/bin/apt-get')) throw new Halt(`${reason} This is no Debian system, so install ${name} by your system's own means and start again.`);
  if (!isRoot()) throw new Halt(`${reason} Install it with this one command, then start again:\n\n  sudo sh -c 'apt-get update && apt-get install -y --no-install-recommends ${name}'\n`);
  say('packages', `installing ${name} with apt-get`);
  apt(['update', '-q']);
  apt(['install', '-y', '-q', '--no-install-recommends', '-o', 'Dpkg::Options::=--force-confold', name]);
};
