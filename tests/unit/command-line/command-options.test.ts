import { readOptions } from '../../../server/bin/simulate/command-options';
import { InputProblem } from '../../../server/bin/simulate/problem';

const refusalOf = (...words: string[]): string => {
  try {
    readOptions(words);
  } catch (error) {
    if (error instanceof InputProblem) return error.issues.map(({ path, message }) => `${path}: ${message}`).join('\n');
    throw error;
  }
  return '';
};

describe('the words of the command', () => {
  it('a file alone', () => expect(readOptions(['a.json'])).toEqual({ file: 'a.json', csv: false, schema: undefined, overrides: [], accepted: new Set() }));
  it('- is standard input', () => expect(readOptions(['-'])?.file).toBe('-'));
  it('--csv does not swallow the file', () => expect(readOptions(['--csv', 'a.json'])).toMatchObject({ file: 'a.json', csv: true }));
  it('--schema alone is the schema of a scenario', () => expect(readOptions(['--schema'])).toMatchObject({ schema: 'scenario', file: undefined }));
  it('--schema result is the schema of what is printed', () => expect(readOptions(['--schema', 'result'])?.schema).toBe('result'));

  it('checks that need not be assessed, together or one by one', () => {
    const { accepted } = readOptions(['a.json', '--accept-not-assessed', 'limiter-energy,limiter-loss', '--accept-not-assessed', 'peak-current'])!;
    expect(accepted).toEqual(new Set(['limiter-energy', 'limiter-loss', 'peak-current']));
  });

  it('overrides, one after another', () => {
    const { overrides } = readOptions(['a.json', '--at', 'bulk.capacitance=470u', '--at', 'limits={"peakCurrent": 20}'])!;
    expect(overrides).toEqual([
      { path: ['bulk', 'capacitance'], value: '470u' },
      { path: ['limits'], value: { peakCurrent: 20 } },
    ]);
  });
});

describe('words that are not understood are refused with what to write', () => {
  it.each<[string, string[], RegExp]>([
    ['nothing', [], /name a scenario file, or - for standard input/],
    ['an unknown option', ['a.json', '--fast'], /unknown option '--fast'/],
    ['two files', ['a.json', 'b.json'], /too many arguments/],
    ['an option without its value', ['a.json', '--at'], /argument missing/],
    ['an override without =', ['a.json', '--at', 'bulk.capacitance'], /write key=value/],
    ['an override without a key', ['a.json', '--at', '=5'], /write key=value/],
    ['an override with a gap', ['a.json', '--at', 'bulk..esr=5'], /write key=value/],
    ['an override that is half JSON', ['a.json', '--at', 'bulk={"esr":'], /^bulk: .*not valid JSON/],
    ['a check that does not exist', ['a.json', '--accept-not-assessed', 'peak'], /"peak" is no check/],
    ['a schema that does not exist', ['--schema', 'traces'], /Allowed choices are scenario, result/],
  ])('%s', (_, words, message) => expect(refusalOf(...words)).toMatch(message));
});
