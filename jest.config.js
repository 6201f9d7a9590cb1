/** Everything but components runs on plain Node; components run in jsdom under the Expo web preset. */
const common = {
  moduleNameMapper: { '^@/(.*)$': '<rootDir>/$1' },
  modulePathIgnorePatterns: ['<rootDir>/dist/', '<rootDir>/\\.expo/', '<rootDir>/\\.data/', '<rootDir>/out/'],
};

const node = {
  ...common,
  testEnvironment: 'node',
  transform: {
    '\\.[jt]sx?$': ['babel-jest', { caller: { name: 'metro', bundler: 'metro', platform: 'web', isServer: true } }],
    '\\.mjs$': ['babel-jest', {}],
  },
  // jose comes as ES modules only.
  transformIgnorePatterns: ['/node_modules/(?!(jose)/)'],
};

/** One throw-away PostgreSQL for the whole run; Jest starts it once for the projects that name it. */
const postgres = {
  globalSetup: '<rootDir>/tests/helpers/postgres-setup.mjs',
  globalTeardown: '<rootDir>/tests/helpers/postgres-teardown.mjs',
};

module.exports = {
  // Only ends what hangs: on a busy machine with cold caches the slowest browser test takes a part of it.
  testTimeout: 180_000,
  projects: [
    {
      ...node,
      displayName: 'unit',
      testMatch: ['<rootDir>/tests/{geometry,shared,cli}/**/*.test.ts'],
    },
    {
      ...node,
      ...postgres,
      displayName: 'server',
      testMatch: ['<rootDir>/tests/{server,migrations,seeds,scripts}/**/*.test.ts'],
    },
    {
      ...common,
      displayName: 'components',
      preset: 'jest-expo/web',
      testMatch: ['<rootDir>/tests/{app,components,public}/**/*.test.{ts,tsx}'],
      setupFiles: ['<rootDir>/tests/helpers/component-setup.ts'],
    },
    {
      ...node,
      ...postgres,
      displayName: 'browser',
      testMatch: ['<rootDir>/tests/e2e/**/*.test.ts'],
      setupFilesAfterEnv: ['<rootDir>/tests/helpers/browser-setup.ts'],
    },
  ],
};
