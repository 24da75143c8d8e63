/** Four projects: pure shared code, the server on real services, components in a DOM, and the whole in a browser. */
const swc = {
  '^.+\\.(t|j|mj)sx?$': [
    '@swc/jest',
    {
      jsc: {
        parser: { syntax: 'typescript', decorators: true },
        transform: { legacyDecorator: true, decoratorMetadata: false },
        target: 'es2022',
      },
      module: { type: 'commonjs' },
    },
  ],
};
// These ship ES modules only; Jest 29 needs them as CommonJS.
const esmOnly = [
  'uuid',
  'marked',
  'file-type',
  'strtok3',
  'token-types',
  'uint8array-extras',
  '@tokenizer',
  '@borewit',
];
const transformIgnorePatterns = [`/node_modules/(?!(${esmOnly.join('|')})/)`];

module.exports = {
  projects: [
    {
      displayName: 'shared',
      testEnvironment: 'node',
      testMatch: ['<rootDir>/tests/unit/**/*.test.ts'],
      transform: swc,
      transformIgnorePatterns,
    },
    {
      displayName: 'server',
      globalSetup: '<rootDir>/tests/api/setup/services.ts',
      globalTeardown: '<rootDir>/tests/api/setup/stop-services.ts',
      testEnvironment: 'node',
      testMatch: ['<rootDir>/tests/api/**/*.test.ts'],
      // Its exports know only `import`, which Jest's CommonJS does not ask for.
      moduleNameMapper: {
        '^file-type$': '<rootDir>/node_modules/file-type/index.js',
        '^strtok3$': '<rootDir>/node_modules/strtok3/lib/index.js',
      },
      transform: swc,
      transformIgnorePatterns,
    },
    {
      displayName: 'app',
      preset: 'jest-expo/web',
      // The preset's own list, and what ships ES modules only.
      transformIgnorePatterns: [
        `/node_modules/(?!(react-native|@react-native|expo|@expo|react-navigation|@react-navigation|standard-navigation|${esmOnly.join('|')}))`,
        '/node_modules/react-native-reanimated/plugin/',
        '/node_modules/@react-native/babel-preset/',
      ],
      testMatch: ['<rootDir>/tests/components/**/*.test.tsx'],
    },
    {
      displayName: 'browser',
      testEnvironment: 'node',
      testMatch: ['<rootDir>/tests/browser/**/*.test.ts'],
      globalSetup: '<rootDir>/tests/browser/harness-setup.ts',
      globalTeardown: '<rootDir>/tests/browser/harness-teardown.ts',
      transform: swc,
      transformIgnorePatterns,
    },
  ],
};
