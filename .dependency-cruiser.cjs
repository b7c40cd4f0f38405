/**
 * The import rules of the house: app → components → hooks → shared and server → simulation → shared.
 * Everything runs down only; the client and the server meet in shared and nowhere else.
 * tests/architecture plants a violation of each rule and expects it to be named.
 */
const CLIENT = '^(app|components|hooks)/';
const INSIDE_NODE_MODULES = 'node_modules/';

/** What does not resolve is no-unresolved's business. */
const OURS = ['local', 'aliased', 'aliased-tsconfig', 'aliased-tsconfig-paths', 'unknown'];

const forbid = (name, comment, from, to) => ({ name, comment, severity: 'error', from, to });

module.exports = {
  forbidden: [
    // Tables that refer to each other make their entities do so; the mapper asks for it.
    forbid('no-cycles', 'Two files that need each other are one file, or lack a third.', { pathNot: '-entity\\.ts$' }, { circular: true }),
    forbid('no-unresolved', 'An import that leads nowhere.', {}, { couldNotResolve: true }),
    forbid('no-undeclared-package', 'A package must stand in package.json.', {}, { dependencyTypes: ['npm-no-pkg', 'npm-unknown'] }),
    forbid(
      'no-tests-in-source',
      'What runs never leans on tests.',
      { path: '^(app|components|hooks|shared|server|simulation)/' },
      { path: '^tests/' },
    ),

    forbid('client-not-to-server', 'The client reaches the server through the API alone.', { path: CLIENT }, { path: '^(server|simulation)/' }),
    forbid('server-not-to-client', 'The server serves the client and knows nothing of it.', { path: '^(server|simulation)/' }, { path: CLIENT }),
    forbid('components-not-to-app', 'Imports run down: app → components.', { path: '^components/' }, { path: '^app/' }),
    forbid('hooks-stay-below', 'Imports run down: components → hooks.', { path: '^hooks/' }, { path: '^(app|components)/' }),
    forbid('shared-imports-nothing-of-ours', 'The contract stands alone.', { path: '^shared/' }, { path: '^(app|components|hooks|server|simulation|assets)/' }),
    forbid(
      'shared-packages',
      'From outside the contract uses zod and mathjs only.',
      { path: '^shared/' },
      { dependencyTypesNot: OURS, pathNot: `${INSIDE_NODE_MODULES}(zod|mathjs)/` },
    ),
    forbid('simulation-not-to-server', 'The engine is pure; the server calls it.', { path: '^simulation/' }, { path: '^server/' }),
    forbid(
      'simulation-packages',
      'From outside the engine uses ode-rk4 only: no I/O, no clock, no Node.',
      { path: '^simulation/' },
      { dependencyTypesNot: OURS, pathNot: `${INSIDE_NODE_MODULES}ode-rk4/` },
    ),
    forbid('simulation-through-its-index', 'simulation/index.ts is the only door of the engine.', { path: '^server/' }, { path: '^simulation/', pathNot: '^simulation/index\\.ts$' }),

    forbid('client-without-node', 'The client runs in a browser and on a phone.', { path: CLIENT }, { dependencyTypes: ['core'] }),
    forbid(
      'client-without-server-packages',
      'Packages of the server have no place in the client.',
      { path: CLIENT },
      { path: `${INSIDE_NODE_MODULES}(express|typeorm|pg|piscina|pino|pino-http|jsonwebtoken|bcryptjs|helmet|ode-rk4|commander)/` },
    ),
    forbid(
      'server-without-client-packages',
      'Packages of the client have no place in the server.',
      { path: '^server/' },
      { path: `${INSIDE_NODE_MODULES}(expo[^/]*|react[^/]*|victory[^/]*|@tanstack/[^/]+|@expo/[^/]+)/` , pathNot: `${INSIDE_NODE_MODULES}reflect-metadata/` },
    ),
    forbid('routes-do-not-fetch', 'A route hands over to a screen; the screen fetches through a hook.', { path: '^app/', pathNot: '_layout\\.tsx$' }, { path: '^hooks/' }),

    forbid(
      'features-apart',
      'Screens of different features meet only through ui, charts and path-strip.',
      { path: '^components/(?!ui/|charts/|path-strip/)([^/]+)/' },
      { path: '^components/', pathNot: '^components/(ui|charts|path-strip|$1)/' },
    ),
    forbid('signatures-know-no-feature', 'Charts and the path strip are used by features and know none.', { path: '^components/(charts|path-strip)/' }, { path: '^components/', pathNot: '^components/(ui|charts|path-strip)/' }),
    forbid('ui-knows-no-domain', 'The kit has no domain words and builds on nothing of ours but itself.', { path: '^components/ui/' }, { path: '^components/', pathNot: '^components/ui/' }),
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '^(dist|\\.local|\\.expo|coverage)/' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.json' },
    parser: 'tsc',
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'require', 'node', 'default', 'types'],
      extensions: ['.ts', '.tsx', '.mjs', '.cjs', '.js', '.json'],
      mainFields: ['module', 'main', 'types'],
    },
  },
};
