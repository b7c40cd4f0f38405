import { spawnSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync, copyFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';

import { PARTNERS, PLANTED, TARGETS } from './planted';

const ROOT = path.resolve(__dirname, '../..');
const FOLDERS = ['app', 'components', 'hooks', 'shared', 'server', 'simulation'];

interface Violation {
  from: string;
  rule: { name: string };
}

/** A house of our shape in a folder of its own, so that nothing is ever planted in the real one. */
const buildHouse = (files: { file: string; code: string }[]): string => {
  const house = mkdtempSync(path.join(os.tmpdir(), 'house-'));
  symlinkSync(path.join(ROOT, 'node_modules'), path.join(house, 'node_modules'));
  for (const name of ['package.json', 'tsconfig.json', '.dependency-cruiser.cjs']) copyFileSync(path.join(ROOT, name), path.join(house, name));
  const targets = TARGETS.map((file) => ({ file, code: 'export const thing = 1;\n' }));
  for (const { file, code } of [...targets, ...files]) {
    mkdirSync(path.dirname(path.join(house, file)), { recursive: true });
    writeFileSync(path.join(house, file), code);
  }
  return house;
};

const violationsIn = (house: string): Violation[] => {
  const cruiser = path.join(ROOT, 'node_modules/dependency-cruiser/bin/dependency-cruise.mjs');
  const { stdout } = spawnSync(process.execPath, [cruiser, '--config', '.dependency-cruiser.cjs', '--output-type', 'json', ...FOLDERS], { cwd: house, encoding: 'utf8', maxBuffer: 2 ** 26 });
  return (JSON.parse(stdout) as { summary: { violations: Violation[] } }).summary.violations;
};

describe('the import rules', () => {
  let house: string;
  let found: Violation[];

  beforeAll(() => {
    house = buildHouse([...PLANTED, ...PARTNERS]);
    found = violationsIn(house);
  }, 120_000);
  afterAll(() => rmSync(house, { recursive: true, force: true }));

  it.each(PLANTED)('$rule bites on $file', ({ file, rule }) => {
    expect(found.filter(({ from }) => from === file).map(({ rule: { name } }) => name)).toContain(rule);
  });

  it('leave a house without planted files alone', () => {
    const clean = buildHouse([]);
    expect(violationsIn(clean)).toEqual([]);
    rmSync(clean, { recursive: true, force: true });
  }, 60_000);
});
