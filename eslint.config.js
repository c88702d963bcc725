import js from '@eslint/js';
import checkFile from 'eslint-plugin-check-file';
import importX from 'eslint-plugin-import-x';
import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

/** Imports point down. Each zone says what to do instead; tests/architecture.test.ts is the judge. */
const zones = [
  { target: './shared', from: ['./api', './web', './tests'], message: 'shared is pure: it imports nothing above it.' },
  { target: './api', from: ['./web', './tests'], message: 'The API knows shared only.' },
  { target: './web', from: ['./api', './tests'], message: 'The web client talks to the API through shared contracts.' },
  {
    target: './web/src/lib',
    from: ['./web/src/components', './web/src/features', './web/src/book', './web/src/pages'],
    message: 'lib is the lowest layer of the web client.',
  },
  {
    target: './web/src/components',
    from: ['./web/src/features', './web/src/book', './web/src/pages'],
    message: 'The component kit knows no feature.',
  },
  { target: './web/src/features', from: ['./web/src/book', './web/src/pages'], message: 'Pages compose features.' },
  {
    target: './web/src/book',
    from: ['./web/src/features', './web/src/pages'],
    message: 'The Book stands alone; pages compose it.',
  },
  {
    target: './api/src/entities',
    from: ['./api/src/repositories', './api/src/services', './api/src/routes'],
    message: 'Entities are the lowest layer of the API.',
  },
  {
    target: './api/src/repositories',
    from: ['./api/src/services', './api/src/routes'],
    message: 'Repositories know entities only.',
  },
  { target: './api/src/services', from: ['./api/src/routes'], message: 'Services do not know HTTP.' },
  {
    target: './api/src/routes',
    from: ['./api/src/entities'],
    message: 'Routes call services; an entity never reaches a response.',
  },
];

export default tseslint.config(
  { ignores: ['**/dist/**', '**/node_modules/**', '.data/**', 'coverage/**'] },
  js.configs.recommended,
  {
    files: ['**/*.{ts,tsx}'],
    extends: [...tseslint.configs.recommendedTypeChecked],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    plugins: { 'import-x': importX, 'check-file': checkFile },
    settings: { 'import-x/resolver-next': [], 'import-x/extensions': ['.ts', '.tsx'] },
    rules: {
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/switch-exhaustiveness-check': ['error', { considerDefaultExhaustiveForUnions: true }],
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      'import-x/no-restricted-paths': ['error', { zones, basePath: import.meta.dirname }],
      'import-x/no-default-export': 'error',
      'check-file/filename-naming-convention': [
        'error',
        { '**/*.{ts,tsx}': 'KEBAB_CASE' },
        { ignoreMiddleExtensions: true },
      ],
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'random', message: 'Results are reproducible: a seed comes in.' },
      ],
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      'no-console': 'error',
    },
  },
  {
    files: ['web/src/**/*.{ts,tsx}', 'tests/web/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': reactHooks },
    rules: { 'react-hooks/rules-of-hooks': 'error', 'react-hooks/exhaustive-deps': 'error' },
  },
  {
    files: ['shared/src/**/*.ts'],
    rules: {
      'no-restricted-globals': [
        'error',
        ...['window', 'document', 'fetch', 'process', 'localStorage', 'setTimeout', 'performance'].map((name) => ({
          name,
          message: 'shared is pure: no I/O, no DOM, no clock.',
        })),
      ],
    },
  },
  { files: ['**/*.config.ts', 'eslint.config.js'], rules: { 'import-x/no-default-export': 'off' } },
  {
    files: ['**/*.{mjs,js}'],
    languageOptions: {
      ecmaVersion: 2024,
      sourceType: 'module',
      globals: {
        process: 'readonly',
        console: 'readonly',
        URL: 'readonly',
        setTimeout: 'readonly',
        clearTimeout: 'readonly',
        fetch: 'readonly',
        AbortSignal: 'readonly',
        Buffer: 'readonly',
        performance: 'readonly',
      },
    },
  },
);
