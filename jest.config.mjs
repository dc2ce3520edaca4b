import { fileURLToPath } from 'node:url';

const path = (relative) => fileURLToPath(new URL(relative, import.meta.url));

/** Relative imports end in `.js` as Node wants them; in a test they mean the TypeScript source beside it. */
const moduleNameMapper = {
  '^(\\.{1,2}/.*)\\.js$': '$1',
  '^@emberlot/(shared|db|fakes)/(.*)$': path('./') + '$1/src/$2.ts',
};

const swc = (parser) => [
  '@swc/jest',
  {
    jsc: {
      target: 'es2023',
      parser: { syntax: 'typescript', ...parser },
      transform: { legacyDecorator: true, decoratorMetadata: true, react: { runtime: 'automatic' } },
      keepClassNames: true,
    },
    module: { type: 'es6' },
    sourceMaps: 'inline',
  },
];

/** Runs once, and only when a test of such a project is among those asked for. */
const withDatabase = {
  globalSetup: path('./e2e/scripts/database-setup.mjs'),
  globalTeardown: path('./e2e/scripts/database-teardown.mjs'),
};

const node = (name, extra = {}) => ({
  displayName: name,
  rootDir: path(`./${name}`),
  testEnvironment: 'node',
  testMatch: ['<rootDir>/src/**/*.(test|spec).ts'],
  extensionsToTreatAsEsm: ['.ts'],
  moduleNameMapper,
  transform: { '^.+\\.ts$': swc({ decorators: true }) },
  ...extra,
});

export default {
  // What is tested is whether it comes out right, not how busy the machine is.
  testTimeout: 60_000,
  projects: [
    node('shared'),
    node('db', withDatabase),
    node('fakes'),
    node('server', withDatabase),
    {
      displayName: 'client',
      rootDir: path('./client'),
      testEnvironment: path('./client/jest-environment.mjs'),
      testMatch: ['<rootDir>/src/**/*.test.(ts|tsx)'],
      extensionsToTreatAsEsm: ['.ts', '.tsx'],
      moduleNameMapper: { ...moduleNameMapper, '\\.(css|svg)$': path('./client/src/lib/empty-module.ts') },
      transform: { '^.+\\.tsx?$': swc({ tsx: true }) },
      setupFilesAfterEnv: [path('./client/jest-setup.ts')],
    },
    {
      displayName: 'scripts',
      rootDir: path('.'),
      roots: ['db', 'server', 'e2e'].map((workspace) => path(`./${workspace}/scripts`)),
      testEnvironment: 'node',
      testMatch: ['**/*.test.mjs'],
      transform: {},
    },
  ],
  testSequencer: path('./e2e/scripts/shuffle-sequencer.mjs'),
  reporters: ['default', path('./e2e/scripts/count-reporter.mjs')],
};
