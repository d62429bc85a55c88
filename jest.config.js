/** One project in plain Node: the app is tested where people meet it, in a real browser. */
module.exports = {
  testEnvironment: 'node',
  // Math belongs to the realm of the tests otherwise, and each call of it crosses over: twice the time.
  sandboxInjectedGlobals: ['Math'],
  roots: ['<rootDir>/tests'],
  testMatch: ['**/*.test.ts'],
  // Browsers and servers start inside tests; two cores are shared by all of them.
  testTimeout: 60_000,
  transform: {
    '\\.(ts|tsx|mjs)$': [
      '@swc/jest',
      {
        module: { type: 'commonjs' },
        jsc: {
          target: 'es2022',
          parser: { syntax: 'typescript', tsx: true, decorators: true },
          transform: {
            legacyDecorator: true,
            decoratorMetadata: true,
            useDefineForClassFields: false,
            react: { runtime: 'automatic' },
          },
        },
      },
    ],
  },
  transformIgnorePatterns: ['/node_modules/(?!(d3-[a-z]+|internmap)/)'],
};
