/** Three projects in one run: screens, what is pure, and the server against a real PostgreSQL. */
const babelForNode = {
  presets: ['babel-preset-expo'],
  caller: { name: 'metro', platform: 'web', isServer: true },
  babelrc: false,
  configFile: false,
};

const shared = {
  modulePathIgnorePatterns: ['<rootDir>/dist/', '<rootDir>/.data/', '<rootDir>/.expo/'],
};

const node = {
  ...shared,
  testEnvironment: 'node',
  transform: { '\\.[cm]?[jt]sx?$': ['babel-jest', babelForNode] },
  setupFiles: ['<rootDir>/tests/support/setup-node.ts'],
};

module.exports = {
  maxWorkers: 2,
  // A real database and argon2id are slower than the 5 s that jest grants, on a busy two-core machine.
  testTimeout: 30_000,
  projects: [
    {
      ...shared,
      displayName: 'components',
      preset: 'jest-expo',
      // jest resolves the icons to their ES modules, which nothing here transforms.
      moduleNameMapper: { '^lucide-react-native/icons/(.*)$': '<rootDir>/node_modules/lucide-react-native/dist/cjs/icons/$1.js' },
      testMatch: ['<rootDir>/tests/components/**/*.test.ts?(x)'],
      setupFilesAfterEnv: ['<rootDir>/tests/support/setup-components.ts'],
    },
    {
      ...node,
      displayName: 'pure',
      testMatch: ['<rootDir>/tests/{pricing,shared}/**/*.test.ts', '<rootDir>/tests/*.test.ts'],
    },
    {
      ...node,
      displayName: 'server',
      testMatch: ['<rootDir>/tests/server/**/*.test.ts'],
      // Only a run that has server tests starts a database.
      globalSetup: '<rootDir>/tests/support/global-setup.mjs',
      globalTeardown: '<rootDir>/tests/support/global-teardown.mjs',
    },
  ],
};
