import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';

import { runChild } from './children.mjs';
import { ROOT } from './paths.mjs';
import { Halt, say, seconds } from './say.mjs';

const MARK = path.join(ROOT, 'node_modules/.installed-from');

const lockHash = () => createHash('sha256').update(readFileSync(path.join(ROOT, 'package-lock.json'))).digest('hex');

/** Installs the npm packages where those present do not come from this very lock file. */
export const ensurePackages = async () => {
  const wanted = lockHash();
  if (existsSync(MARK) && readFileSync(MARK, 'utf8') === wanted) return;
  const began = Date.now();
  say('packages', 'installing from npm by package-lock.json; the first time this takes a minute or two');
  const npm = process.env.npm_execpath ? [process.execPath, process.env.npm_execpath] : ['npm'];
  const status = await runChild(npm[0], [...npm.slice(1), 'ci', '--loglevel=error', '--no-audit', '--no-fund', '--include=dev'], { cwd: ROOT, stdio: ['ignore', 'ignore', 'inherit'] });
  if (status !== 0) throw new Halt('npm could not install the packages; see above. Check the connection and the free space, then start again.');
  writeFileSync(MARK, wanted);
  say('packages', `installed in ${seconds(began)}`);
};
