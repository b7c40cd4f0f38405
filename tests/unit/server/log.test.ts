import { spawnSync } from 'node:child_process';
import { join } from 'node:path';

const ROOT = join(__dirname, '..', '..', '..');
const LOGS_A_FAILED_STATEMENT = `
  const { QueryFailedError } = require('typeorm');
  const { createLog } = require('./server/log.ts');
  createLog('info').error({ err: new QueryFailedError('SELECT $1', ['a secret'], Object.assign(new Error('refused'), { code: '23505' })) }, 'unexpected error');`;

test('a failed statement is logged as one line of JSON on standard error, without what was in it', () => {
  const { stdout, stderr } = spawnSync(process.execPath, ['-r', './server/bin/typescript-hook.js', '-e', LOGS_A_FAILED_STATEMENT], { cwd: ROOT, encoding: 'utf8' });
  expect(stdout).toBe('');
  expect(JSON.parse(stderr)).toMatchObject({ level: 50, msg: 'unexpected error', err: { message: 'refused', query: 'SELECT $1' } });
  expect(stderr).not.toContain('a secret');
});
