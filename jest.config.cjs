// One project per kind of test, so that each can be run alone: npx jest --selectProjects unit
const shared = {
  rootDir: __dirname,
  testEnvironment: 'node',
  moduleNameMapper: {
    '^@/(.*)$': '<rootDir>/$1',
    '^react-native$': 'react-native-web',
  },
  transform: {
    '\\.[cm]?[jt]sx?$': [
      '@swc/jest',
      {
        jsc: {
          parser: { syntax: 'typescript', tsx: true, decorators: true },
          target: 'es2022',
          transform: {
            legacyDecorator: true,
            decoratorMetadata: false,
            useDefineForClassFields: false,
            react: { runtime: 'automatic' },
          },
        },
      },
    ],
  },
  // Several packages are ES modules only: everything goes through the transform.
  transformIgnorePatterns: [],
  modulePathIgnorePatterns: ['<rootDir>/.data', '<rootDir>/dist'],
};

const onDatabase = {
  globalSetup: '<rootDir>/tests/support/global-database.mjs',
  globalTeardown: '<rootDir>/tests/support/end-database.mjs',
};
const slow = { setupFilesAfterEnv: ['<rootDir>/tests/support/long-timeout.ts'] };
const special = ['server', 'flows', 'faults', 'fuzz'].map((name) => `<rootDir>/tests/${name}/`);

module.exports = {
  projects: [
    {
      ...shared,
      displayName: 'unit',
      testMatch: ['<rootDir>/tests/**/*.test.{ts,tsx}'],
      testPathIgnorePatterns: special,
    },
    {
      ...shared,
      ...onDatabase,
      setupFilesAfterEnv: ['<rootDir>/tests/support/patient-timeout.ts'],
      displayName: 'api',
      testMatch: ['<rootDir>/tests/server/**/*.test.ts'],
    },
    {
      ...shared,
      ...onDatabase,
      ...slow,
      displayName: 'flows',
      testMatch: ['<rootDir>/tests/flows/**/*.flow.ts'],
    },
    {
      ...shared,
      ...onDatabase,
      ...slow,
      displayName: 'faults',
      testMatch: ['<rootDir>/tests/faults/**/*.test.ts'],
    },
    {
      ...shared,
      ...onDatabase,
      ...slow,
      displayName: 'fuzz',
      testMatch: ['<rootDir>/tests/fuzz/**/*.test.ts'],
    },
  ],
};
