import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

import { resultSchema } from '../../server/bin/simulate/result';

const ROOT = join(__dirname, '../..');
const EXAMPLES = 'assets/examples';

/** The command as a user starts it, in a process of its own. */
const simulate = (words: readonly string[], input = '') => {
  const { status, stdout, stderr } = spawnSync(process.execPath, ['-r', './server/bin/typescript-hook.js', 'server/bin/simulate.ts', ...words], { cwd: ROOT, input, encoding: 'utf8', maxBuffer: 64 * 1024 * 1024 });
  return { status, stdout, stderr };
};
const issuesIn = (stderr: string) => (JSON.parse(stderr.trim().split('\n').at(-1)!) as { issues: { path: string; message: string }[] }).issues;
const exampleText = (name: string) => readFileSync(join(ROOT, EXAMPLES, name), 'utf8');

describe('exit code and output', () => {
  it('0 within ratings, and JSON alone on standard output', () => {
    const { status, stdout, stderr } = simulate([`${EXAMPLES}/mains-supply-ntc.json`]);
    expect({ status, stderr }).toEqual({ status: 0, stderr: '' });
    const result = resultSchema.parse(JSON.parse(stdout));
    expect(result).toMatchObject({ withinRatings: true, because: [], verdict: { status: 'pass' } });
    expect(result.figures.peakCurrent).toBeGreaterThan(1);
    expect(result.events[0]).toMatchObject({ kind: 'switch-on', at: 0 });
    expect(result.audit.clean).toBe(true);
  });

  it('1 when a check fails, which is named', () => {
    const { status, stdout } = simulate([`${EXAMPLES}/no-limiter-no-load.json`]);
    expect(status).toBe(1);
    expect(resultSchema.parse(JSON.parse(stdout)).because).toContain('peak-current: fails');
  });

  it('1 when a check is not assessed, 0 when it is accepted by name', () => {
    const file = `${EXAMPLES}/not-assessed-set-aside.json`;
    const { status, stdout } = simulate([file]);
    expect(status).toBe(1);
    const open = resultSchema.parse(JSON.parse(stdout)).checks.filter((check) => check.status === 'not-assessed').map(({ id }) => id);
    expect(open.length).toBeGreaterThan(0);
    expect(simulate([file, '--accept-not-assessed', [...new Set(open)].join(',')]).status).toBe(0);
  });

  it('2 on a bad field, named on standard error, nothing on standard output', () => {
    const { status, stdout, stderr } = simulate([`${EXAMPLES}/mains-supply-ntc.json`, '--at', 'bulk.capacitance=470 V']);
    expect({ status, stdout }).toEqual({ status: 2, stdout: '' });
    expect(stderr).toContain('bulk.capacitance: "470 V" is not a value in F; write for example 470u');
    expect(issuesIn(stderr)).toEqual([{ path: 'bulk.capacitance', message: '"470 V" is not a value in F; write for example 470u' }]);
  });

  it.each<[string, string[], string]>([
    ['a file that is not there', ['nowhere.json'], ''],
    ['a folder', [EXAMPLES], ''],
    ['half a JSON', ['-'], '{"name": "x"'],
    ['nothing at all', ['-'], ''],
    ['JSON nested without end', ['-'], '['.repeat(200_000)],
    ['an unknown option', ['--turbo'], ''],
    ['no file', [], ''],
  ])('2 on %s', (_, words, input) => {
    const { status, stdout, stderr } = simulate(words, input);
    expect({ status, stdout }).toEqual({ status: 2, stdout: '' });
    expect(issuesIn(stderr).length).toBeGreaterThan(0);
    expect(stderr).not.toMatch(/\n\s+at /);
  });
});

describe('other ways in and out', () => {
  it('a scenario from standard input', () => {
    const { status, stdout } = simulate(['-'], exampleText('mains-supply-ntc.json'));
    expect(status).toBe(0);
    expect(JSON.parse(stdout)).toEqual(JSON.parse(simulate([`${EXAMPLES}/mains-supply-ntc.json`]).stdout));
  });

  it('an override changes the result', () => {
    const peakAt = (...more: string[]) => (JSON.parse(simulate([`${EXAMPLES}/no-limiter-no-load.json`, ...more]).stdout) as { figures: { peakCurrent: number } }).figures.peakCurrent;
    expect(peakAt('--at', 'source.impedance.resistance=3', '--at', 'limits.peakCurrent=500')).toBeLessThan(peakAt());
  });

  it('--csv prints the traces, with the same exit code', () => {
    const { status, stdout } = simulate([`${EXAMPLES}/no-limiter-no-load.json`, '--csv']);
    expect(status).toBe(1);
    const [header, ...rows] = stdout.trimEnd().split('\n');
    expect(header).toMatch(/^scale,time_s,current_A/);
    expect(rows.length).toBeGreaterThan(30);
    for (const row of rows) {
      expect(row.split(',').length).toBe(header!.split(',').length);
      expect(row).not.toMatch(/NaN|Infinity|undefined|null/);
    }
  });

  it('a file beside the project, by its full path', () => {
    const folder = mkdtempSync(join(tmpdir(), 'scenario-'));
    try {
      const file = join(folder, 'with a space.json');
      writeFileSync(file, `\ufeff${exampleText('no-limiter-no-load.json')}`);
      const { status, stdout } = simulate([file]);
      expect(status).toBe(1);
      expect(JSON.parse(stdout)).toMatchObject({ withinRatings: false });
    } finally {
      rmSync(folder, { recursive: true });
    }
  });

  it.each(['scenario', 'result'])('--schema %s is a JSON Schema of draft 2020-12', (what) => {
    const { status, stdout } = simulate(['--schema', what]);
    expect(status).toBe(0);
    expect(JSON.parse(stdout)).toMatchObject({ $schema: 'https://json-schema.org/draft/2020-12/schema', type: 'object' });
  });

  it('--help says what the exit codes mean', () => {
    const { status, stdout } = simulate(['--help']);
    expect(status).toBe(0);
    expect(stdout).toMatch(/Exit codes:[\s\S]*2 {2}the input was refused/);
  });
});
