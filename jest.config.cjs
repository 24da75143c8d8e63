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
      testEnvironment: 'node',
      testMatch: ['<rootDir>/tests/api/**/*.test.ts'],
      transform: swc,
      transformIgnorePatterns,
    },
    {
      displayName: 'app',
      preset: 'jest-expo/web',
      testMatch: ['<rootDir>/tests/components/**/*.test.tsx'],
    },
    {
      displayName: 'browser',
      testEnvironment: 'node',
      testMatch: ['<rootDir>/tests/browser/**/*.test.ts'],
      transform: swc,
      transformIgnorePatterns,
    },
  ],
};
