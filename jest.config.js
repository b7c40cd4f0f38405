/**
 * One project for each kind of test, so that `--selectProjects unit` picks a kind and its results
 * carry its name. Everything that runs in Node goes through @swc/jest (which reads .swcrc, as the
 * server itself does); the screens go through Expo's own native preset.
 */
const expoPreset = require('jest-expo/jest-preset');

const [expoIgnore, ...otherIgnores] = expoPreset.transformIgnorePatterns;

const node = (kind, more = {}) => ({
  displayName: kind,
  testEnvironment: 'node',
  // Inside jest's sandbox a global is looked up through the sandbox at every use; the engine lives on these.
  sandboxInjectedGlobals: ['Math', 'Number', 'Float64Array', 'Array', 'Object', 'Map', 'Infinity'],
  testMatch: [`<rootDir>/tests/${kind}/**/*.test.ts`],
  transform: { '\\.[jt]s$': '@swc/jest' },
  moduleNameMapper: { '^@/(.*)$': '<rootDir>/$1' },
  modulePathIgnorePatterns: ['<rootDir>/\\.local/', '<rootDir>/dist/'],
  ...more,
});

const withCluster = { globalSetup: '<rootDir>/tests/support/cluster-setup.mjs', globalTeardown: '<rootDir>/tests/support/cluster-teardown.mjs' };

module.exports = {
  maxWorkers: 2,
  testTimeout: 30_000,
  projects: [
    node('unit'),
    node('validation'),
    node('api', withCluster),
    {
      displayName: 'components',
      preset: 'jest-expo',
      testMatch: ['<rootDir>/tests/components/**/*.test.{ts,tsx}'],
      transform: { '\\.mjs$': expoPreset.transform['\\.[jt]sx?$'] },
      transformIgnorePatterns: [
        expoIgnore.replace('standard-navigation', 'standard-navigation|victory|d3-|internmap|delaunator|delaunay-find'),
        ...otherIgnores,
      ],
      moduleNameMapper: { '^@/(.*)$': '<rootDir>/$1' },
      modulePathIgnorePatterns: ['<rootDir>/\\.local/', '<rootDir>/dist/'],
    },
    node('e2e', withCluster),
    node('architecture'),
  ],
};
