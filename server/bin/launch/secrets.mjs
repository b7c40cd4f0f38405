import { randomBytes } from 'node:crypto';
import { existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs';

import { local } from './paths.mjs';
import { Halt } from './say.mjs';

const random = () => randomBytes(32).toString('base64url');

/** Random passwords and the key of the sessions, drawn once and kept for this user alone. */
export const readSecrets = () => {
  const file = local('secrets.json');
  try {
    if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8'));
    const drawn = { administrator: random(), application: random(), session: random() };
    writeFileSync(`${file}.new`, JSON.stringify(drawn), { mode: 0o600 });
    renameSync(`${file}.new`, file);
    return drawn;
  } catch (error) {
    if (error instanceof SyntaxError) throw new Halt(`${file} is damaged. Remove it and start again: new passwords are drawn, and everybody signs in anew.`);
    throw new Halt(`Cannot use ${file} (${error.code}). It belongs to another user: start as that user, or remove the folder .local to begin anew.`);
  }
};
