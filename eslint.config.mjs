import tseslint from 'typescript-eslint';
import reactHooks from 'eslint-plugin-react-hooks';

const rawPrimitives = {
  name: 'react-native',
  importNames: ['Text', 'TextInput', 'Pressable', 'TouchableOpacity', 'Button', 'Switch', 'Modal'],
  message: 'Use the primitives of components/ui.',
};

export default tseslint.config(
  {
    ignores: [
      'node_modules/**',
      'dist*/**',
      'build/**',
      '.expo/**',
      '.local/**',
      'coverage/**',
      'public/**',
      '**/*.generated.*',
      '*.cjs',
      'babel.config.js',
      'metro.config.js',
      'expo-env.d.ts',
      'tests/data/**',
    ],
  },
  ...tseslint.configs.recommendedTypeChecked.map((c) => ({ ...c, files: ['**/*.ts', '**/*.tsx'] })),
  {
    files: ['**/*.ts', '**/*.tsx'],
    languageOptions: {
      parserOptions: { project: ['./tsconfig.app.json', './tsconfig.server.json'] },
    },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/ban-ts-comment': 'error',
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_' },
      ],
      '@typescript-eslint/no-misused-promises': [
        'error',
        { checksVoidReturn: { attributes: false } },
      ],
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      'max-lines': ['error', { max: 400 }],
      'max-lines-per-function': ['error', { max: 60, skipBlankLines: true, skipComments: true }],
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      'no-console': 'error',
    },
  },
  {
    files: ['app/**/*.tsx', 'components/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': reactHooks },
    rules: { ...reactHooks.configs.recommended.rules },
  },
  {
    files: ['app/**/*.tsx', 'components/**/*.{ts,tsx}'],
    ignores: ['components/ui/**'],
    rules: { 'no-restricted-imports': ['error', { paths: [rawPrimitives] }] },
  },
  {
    // Markup is long without being deep; logic stays at 60.
    files: ['components/**/*.tsx', 'app/**/*.tsx'],
    rules: {
      'max-lines-per-function': ['error', { max: 100, skipBlankLines: true, skipComments: true }],
    },
  },
  {
    files: ['tests/**/*.{ts,tsx}', '**/*.data.ts', 'server/db/migrations/**'],
    rules: { 'max-lines-per-function': 'off' },
  },
  {
    files: ['**/*.data.ts', 'server/db/migrations/**'],
    rules: { 'max-lines': 'off' },
  },
  {
    files: ['server/cli/**', 'server/local/**', 'tests/**', 'scripts/**'],
    rules: { 'no-console': 'off' },
  },
);
