import { execFileSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import path from 'node:path';

const ROOT = path.resolve(__dirname, '../..');
const tracked = (...patterns: string[]) =>
  execFileSync('git', ['ls-files', '--', ...patterns], { cwd: ROOT, encoding: 'utf8' }).split('\n').filter(Boolean);

/** The folders of the design card; besides these the root holds only what a tool must find there. */
const FOLDERS = ['app', 'assets', 'components', 'hooks', 'server', 'shared', 'simulation', 'tests'];
const LONGEST = 300;

describe('the house', () => {
  it('has the folders of its plan and no others', () => {
    const folders = new Set(tracked().filter((file) => file.includes('/') && !file.startsWith('.')).map((file) => file.split('/')[0]));
    expect([...folders].sort()).toEqual(FOLDERS);
  });

  it('has no source file over 300 lines', () => {
    const sources = tracked('app', 'components', 'hooks', 'server', 'shared', 'simulation', 'tests').filter((file) => /\.(tsx?|mjs|cjs|js)$/.test(file));
    const long = sources.filter((file) => readFileSync(path.join(ROOT, file), 'utf8').split('\n').length > LONGEST + 1);
    expect(sources.length).toBeGreaterThan(200);
    expect(long).toEqual([]);
  });

  it('names no download host in its lock file', () => {
    expect(readFileSync(path.join(ROOT, 'package-lock.json'), 'utf8')).not.toMatch(/"resolved": *"https?:/);
  });

  it('leaves no test out', () => {
    const tests = tracked('tests').filter((file) => /\.test\.tsx?$/.test(file));
    const lame = tests.filter((file) => /\b(describe|it|test)\.(skip|only|todo)\(|\bx(it|describe)\(/.test(readFileSync(path.join(ROOT, file), 'utf8')));
    expect(lame).toEqual([]);
  });
});
