import { spawnSync } from 'node:child_process';
import path from 'node:path';

const ROOT = path.resolve(__dirname, '../..');

/** Rules that ESLint names for a text, as if it stood at that place. */
const lint = (file: string, code: string): string[] => {
  const eslint = path.join(ROOT, 'node_modules/eslint/bin/eslint.js');
  const { stdout } = spawnSync(process.execPath, [eslint, '--stdin', '--stdin-filename', file, '--format', 'json'], { cwd: ROOT, input: code, encoding: 'utf8' });
  const [result] = JSON.parse(stdout) as { messages: { ruleId: string | null }[] }[];
  return (result?.messages ?? []).map(({ ruleId }) => ruleId ?? 'parsing');
};

const CASES: [string, string, string, string][] = [
  ['the engine reads no clock', 'simulation/planted.ts', 'export const now = () => Date.now();\n', 'no-restricted-properties'],
  ['the engine draws no lots', 'simulation/planted.ts', 'export const lot = () => Math.random();\n', 'no-restricted-properties'],
  ['the engine makes no dates', 'simulation/planted.ts', 'export const today = () => new Date();\n', 'no-restricted-syntax'],
  ['the engine opens no files', 'simulation/planted.ts', "import { readFileSync } from 'node:fs';\nexport const read = readFileSync;\n", 'no-restricted-imports'],
  ['hooks know no components', 'hooks/planted.ts', "import { Text } from '@/components/ui/Text';\nexport const used = Text;\n", 'no-restricted-imports'],
  ['the client knows no server', 'components/part/Planted.tsx', "import { assess } from '@/simulation/index';\nexport const used = assess;\n", 'no-restricted-imports'],
  ['exports have names', 'shared/planted.ts', 'export default 1;\n', 'no-restricted-syntax'],
  ['types are known', 'shared/planted.ts', 'export const anything = (value: any) => value;\n', '@typescript-eslint/no-explicit-any'],
  ['a file stays under 300 lines', 'shared/planted.ts', 'export const one = 1;\n'.concat('// line\n'.repeat(300)), 'max-lines'],
];

describe('the lint rules', () => {
  it.each(CASES)('%s', (_, file, code, rule) => {
    expect(lint(file, code)).toContain(rule);
  }, 60_000);
});
