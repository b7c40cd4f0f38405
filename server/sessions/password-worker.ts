import { createHash } from 'node:crypto';
import { compareSync, hashSync } from 'bcryptjs';

import type { PasswordTask } from './passwords';

/** bcrypt reads no further. */
const BCRYPT_BYTES = 72;
const COST = 11;

const withinBcrypt = (password: string): string =>
  Buffer.byteLength(password) <= BCRYPT_BYTES ? password : createHash('sha256').update(password).digest('base64');

/** Runs in a thread of its own: a hash takes about a tenth of a second. */
export const run = (task: PasswordTask): string | boolean =>
  task.kind === 'hash' ? hashSync(withinBcrypt(task.password), COST) : compareSync(withinBcrypt(task.password), task.hash);
