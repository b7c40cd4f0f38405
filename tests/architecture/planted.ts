/** One file that breaks one rule: where it stands, what it imports, and the rule that must name it. */
export interface Planted {
  file: string;
  code: string;
  rule: string;
}

const importing = (path: string) => `import { thing } from '${path}';\nexport const used = thing;\n`;

/** A file for every planted import to lead to. */
export const TARGETS = [
  'app/target.ts',
  'components/ui/target.ts',
  'components/charts/target.ts',
  'components/part/target.ts',
  'hooks/target.ts',
  'shared/target.ts',
  'simulation/index.ts',
  'simulation/inner/target.ts',
  'server/target.ts',
  'tests/target.ts',
];

export const PLANTED: Planted[] = [
  { rule: 'client-not-to-server', file: 'hooks/to-server.ts', code: importing('../server/target') },
  { rule: 'client-not-to-server', file: 'components/part/to-engine.ts', code: importing('../../simulation/index') },
  { rule: 'server-not-to-client', file: 'server/to-hooks.ts', code: importing('../hooks/target') },
  { rule: 'components-not-to-app', file: 'components/part/to-app.ts', code: importing('../../app/target') },
  { rule: 'hooks-stay-below', file: 'hooks/to-components.ts', code: importing('../components/ui/target') },
  { rule: 'shared-imports-nothing-of-ours', file: 'shared/to-hooks.ts', code: importing('../hooks/target') },
  { rule: 'shared-packages', file: 'shared/to-package.ts', code: importing('express') },
  { rule: 'simulation-not-to-server', file: 'simulation/to-server.ts', code: importing('../server/target') },
  { rule: 'simulation-packages', file: 'simulation/to-files.ts', code: importing('node:fs') },
  { rule: 'simulation-packages', file: 'simulation/to-package.ts', code: importing('mathjs') },
  { rule: 'simulation-through-its-index', file: 'server/past-the-door.ts', code: importing('../simulation/inner/target') },
  { rule: 'client-without-node', file: 'hooks/to-node.ts', code: importing('node:path') },
  { rule: 'client-without-server-packages', file: 'hooks/to-express.ts', code: importing('express') },
  { rule: 'server-without-client-packages', file: 'server/to-react.ts', code: importing('react') },
  { rule: 'routes-do-not-fetch', file: 'app/fetching.ts', code: importing('../hooks/target') },
  { rule: 'features-apart', file: 'components/scenario/to-part.ts', code: importing('../part/target') },
  { rule: 'signatures-know-no-feature', file: 'components/charts/to-part.ts', code: importing('../part/target') },
  { rule: 'ui-knows-no-domain', file: 'components/ui/to-charts.ts', code: importing('../charts/target') },
  { rule: 'no-tests-in-source', file: 'server/to-tests.ts', code: importing('../tests/target') },
  { rule: 'no-unresolved', file: 'server/to-nowhere.ts', code: importing('./nowhere') },
  { rule: 'no-cycles', file: 'shared/one.ts', code: importing('./other') },
];

/** The other half of a cycle, which is reported once. */
export const PARTNERS = [{ file: 'shared/other.ts', code: importing('./one') }];
