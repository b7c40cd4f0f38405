import { mkdirSync } from 'node:fs';
import path from 'node:path';

import { Halt } from './say.mjs';

export const ROOT = path.resolve(import.meta.dirname, '../../..');

/** What the two commands keep between starts; never committed. */
export const LOCAL = path.join(ROOT, '.local');

export const local = (name) => path.join(LOCAL, name);

/** Open for passing through, so that the database's own user reaches its folder inside. */
export const makeLocal = () => {
  try {
    mkdirSync(LOCAL, { recursive: true, mode: 0o711 });
  } catch (error) {
    throw new Halt(`Cannot write in ${ROOT} (${error.code}). Give your user the right to write there, or copy the project to a folder of your own.`);
  }
};
