const { defineConfig } = require('eslint/config');
const expo = require('eslint-config-expo/flat');
const tseslint = require('typescript-eslint');

const NODE_GLOBALS = Object.fromEntries(['process', 'console', 'Buffer', 'URL', 'fetch', 'setTimeout', 'clearTimeout', 'setInterval', 'clearInterval', 'AbortSignal', 'require', 'module', '__dirname'].map((name) => [name, 'readonly']));
const CODE = ['**/*.{ts,tsx}'];

/** Refuses imports of our own folders from a folder; the same rules as .dependency-cruiser.cjs, for the editor. */
const refuseFolders = (folders, message) => ({ regex: `^(@/|(\\.\\./)+)(${folders})(/|$)`, message });
const refusePackages = (packages, message) => ({ regex: `^(${packages})(/|$)`, message });
/** Everything that is neither a path nor one of these packages. */
const onlyPackages = (packages, message) => ({ regex: `^(?!\\.|@/|(${packages})(/|$))`, message });

const importsOf = (folder, ...patterns) => ({
  files: [`${folder}/**/*.{ts,tsx}`],
  rules: { 'no-restricted-imports': ['error', { patterns }] },
});

const NODE_MODULES = 'node:.*|fs|path|os|child_process|crypto|http|https|net|stream|worker_threads';
const SERVER_PACKAGES = 'express|typeorm|pg|piscina|pino|pino-http|jsonwebtoken|bcryptjs|helmet|ode-rk4|commander';
const noServer = [
  refuseFolders('server|simulation|tests', 'The client reaches the server through the API alone.'),
  refusePackages(`${NODE_MODULES}|${SERVER_PACKAGES}`, 'This package belongs to the server.'),
  refusePackages('@react-navigation', 'Navigation goes through expo-router.'),
];

const pureEngine = {
  files: ['simulation/**/*.ts'],
  rules: {
    'no-restricted-properties': [
      'error',
      { object: 'Date', property: 'now', message: 'The engine has no clock: take the time as an argument.' },
      { object: 'performance', property: 'now', message: 'The engine has no clock: take the time as an argument.' },
      { object: 'Math', property: 'random', message: 'The engine draws from a seed that is handed in.' },
    ],
    'no-restricted-globals': ['error', 'process', 'console', 'fetch', 'setTimeout', 'setInterval', 'performance', 'window', 'document'],
    'no-restricted-syntax': [
      'error',
      { selector: "NewExpression[callee.name='Date']", message: 'The engine has no clock: take the time as an argument.' },
      { selector: "CallExpression[callee.name='Date']", message: 'The engine has no clock: take the time as an argument.' },
      { selector: 'ExportDefaultDeclaration', message: 'Exports have names.' },
    ],
  },
};

module.exports = defineConfig([
  { ignores: ['node_modules/', 'dist/', '.local/', '.expo/', 'coverage/', 'expo-env.d.ts'] },
  { linterOptions: { noInlineConfig: true } },
  ...expo,
  { files: CODE, extends: [tseslint.configs.recommended] },
  {
    // Resolution, names and cycles are the business of tsc and dependency-cruiser, which do it once and faster.
    rules: { 'import/namespace': 'off', 'import/no-unresolved': 'off', 'import/named': 'off', 'import/no-named-as-default': 'off', 'import/no-named-as-default-member': 'off' },
  },
  {
    rules: {
      'max-lines': ['error', { max: 300 }],
      'max-lines-per-function': ['error', { max: 80, skipComments: true, skipBlankLines: true }],
      eqeqeq: ['error', 'smart'],
      'prefer-const': 'error',
      'no-console': 'error',
    },
  },
  {
    files: CODE,
    rules: {
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/ban-ts-comment': 'error',
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { args: 'after-used', argsIgnorePattern: '^_', ignoreRestSiblings: true }],
      'no-restricted-syntax': ['error', { selector: 'ExportDefaultDeclaration', message: 'Exports have names; only a route of expo-router is a default.' }],
    },
  },
  {
    files: ['server/**/*.ts'],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: __dirname } },
    rules: { '@typescript-eslint/no-floating-promises': 'error', '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: false }] },
  },
  { files: ['{server,simulation,shared}/**'], rules: { 'react-hooks/rules-of-hooks': 'off' } },
  { files: ['app/**/*.tsx'], rules: { 'no-restricted-syntax': 'off' } },
  { files: ['{app,components}/**/*.tsx'], rules: { 'max-lines-per-function': ['error', { max: 110, skipComments: true, skipBlankLines: true }] } },
  // A describe block is a chapter, not a function.
  { files: ['tests/**/*.{ts,tsx}'], rules: { 'max-lines-per-function': 'off' } },
  // What speaks to the terminal may do so.
  { files: ['server/bin/**', 'tests/support/*.mjs', 'tests/bench/**'], rules: { 'no-console': 'off' } },
  { files: ['**/*.{mjs,cjs}', '*.config.js', 'server/bin/*.js', '.dependency-cruiser.cjs'], languageOptions: { globals: NODE_GLOBALS } },
  pureEngine,
  // A package without types of its own is described as it is.
  { files: ['**/*.d.ts'], rules: { 'no-restricted-syntax': 'off' } },

  importsOf('app', ...noServer),
  importsOf('components', ...noServer, refuseFolders('app', 'Imports run down: app → components.')),
  importsOf(
    'components/ui',
    ...noServer,
    refuseFolders('app', 'Imports run down: app → components.'),
    { regex: '^(@/components|\\.\\.)/(?!ui/)[a-z-]+/', message: 'The kit builds on nothing of ours but itself.' },
  ),
  importsOf('hooks', ...noServer, refuseFolders('app|components', 'Imports run down: components → hooks.')),
  importsOf(
    'shared',
    refuseFolders('app|components|hooks|server|simulation|tests', 'The contract stands alone.'),
    onlyPackages('zod|mathjs', 'From outside the contract uses zod and mathjs only.'),
  ),
  importsOf(
    'simulation',
    refuseFolders('app|components|hooks|server|tests', 'The engine is pure.'),
    onlyPackages('ode-rk4', 'From outside the engine uses ode-rk4 only.'),
  ),
  importsOf(
    'server',
    refuseFolders('app|components|hooks|tests', 'The server serves the client and knows nothing of it.'),
    { regex: '^(@/|(\\.\\./)+)simulation/(?!index$)', message: 'simulation/index.ts is the only door of the engine.' },
    refusePackages('react(-native.*|-dom)?|expo.*|victory.*|@tanstack', 'This package belongs to the client.'),
  ),
]);
