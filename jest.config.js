/** Everything but components runs on plain Node; components run in jsdom under the Expo web preset. */
const moduleNameMapper = { '^@/(.*)$': '<rootDir>/$1' };

const node = {
  testEnvironment: 'node',
  transform: {
    '\\.[jt]sx?$': [
      'babel-jest',
      { caller: { name: 'metro', bundler: 'metro', platform: 'web', isServer: true } },
    ],
    '\\.mjs$': ['babel-jest', {}],
  },
  moduleNameMapper,
  transformIgnorePatterns: ['/node_modules/(?!(jose)/)'],
};

module.exports = {
  projects: [
    {
      ...node,
      displayName: 'unit',
      testMatch: ['<rootDir>/tests/{geometry,shared,scripts,cli}/**/*.test.ts'],
    },
    {
      ...node,
      displayName: 'server',
      testMatch: ['<rootDir>/tests/server/**/*.test.ts'],
      globalSetup: '<rootDir>/tests/helpers/postgres-setup.mjs',
      globalTeardown: '<rootDir>/tests/helpers/postgres-teardown.mjs',
    },
    {
      displayName: 'components',
      preset: 'jest-expo/web',
      testMatch: ['<rootDir>/tests/components/**/*.test.{ts,tsx}'],
      setupFiles: ['<rootDir>/tests/helpers/component-setup.ts'],
      moduleNameMapper,
    },
    {
      ...node,
      displayName: 'browser',
      testMatch: ['<rootDir>/tests/e2e/**/*.test.ts'],
      globalSetup: '<rootDir>/tests/helpers/postgres-setup.mjs',
      globalTeardown: '<rootDir>/tests/helpers/postgres-teardown.mjs',
    },
  ],
};
