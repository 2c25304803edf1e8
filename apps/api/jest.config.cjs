/** Server tests: the real application against real PostgreSQL, compiled by swc. */
module.exports = {
  rootDir: __dirname,
  testEnvironment: 'node',
  testMatch: ['<rootDir>/src/**/*.spec.ts', '<rootDir>/test/**/*.spec.ts'],
  globalSetup: '<rootDir>/test/support/global-setup.ts',
  globalTeardown: '<rootDir>/test/support/global-teardown.ts',
  transform: {
    '^.+\\.[cm]?[tj]s$': [
      '@swc/jest',
      {
        jsc: {
          target: 'es2022',
          parser: { syntax: 'typescript', decorators: true },
          transform: { legacyDecorator: true, decoratorMetadata: true },
          keepClassNames: true,
        },
        module: { type: 'commonjs' },
      },
    ],
  },
  transformIgnorePatterns: ['/node_modules/(?!(uuid|@noble|canonicalize|mitt)/)'],
  moduleNameMapper: {
    '^@rimeward/field-log/testing$': '<rootDir>/../../libs/field-log/src/testing/builders.ts',
    '^@rimeward/([a-z-]+)$': '<rootDir>/../../libs/$1/src/index.ts',
  },
  testTimeout: 30_000,
};
