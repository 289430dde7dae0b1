import js from '@eslint/js';
import i18next from 'eslint-plugin-i18next';
import hooks from 'eslint-plugin-react-hooks';
import { defineConfig } from 'eslint/config';
import ts from 'typescript-eslint';

/** Libraries are pure: time, chance and I/O come in as arguments. */
const impure = [
  {
    selector: "MemberExpression[object.name='Date'][property.name='now']",
    message: 'Take the time as an argument.',
  },
  {
    selector: "NewExpression[callee.name='Date'][arguments.length=0]",
    message: 'Take the time as an argument.',
  },
  {
    selector: "MemberExpression[object.name='Math'][property.name='random']",
    message: 'Take a seed as an argument.',
  },
  { selector: "CallExpression[callee.name='fetch']", message: 'A library does no I/O.' },
];

const readonly = (names) => Object.fromEntries(names.split(' ').map((name) => [name, 'readonly']));

export default defineConfig(
  { ignores: ['**/dist/**', '**/node_modules/**', 'var/**', '.nx/**'] },
  js.configs.recommended,
  ts.configs.strict,
  {
    rules: {
      'max-lines': ['error', { max: 400 }],
      'no-console': 'error',
      eqeqeq: 'error',
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-explicit-any': 'error',
      // Nest modules are classes that only carry a decorator.
      '@typescript-eslint/no-extraneous-class': ['error', { allowWithDecorator: true }],
      'no-empty': ['error', { allowEmptyCatch: false }],
      'no-restricted-syntax': [
        'error',
        {
          selector:
            "CallExpression > MemberExpression[property.name='only'][object.name=/^(describe|it|test)$/]",
          message: 'A focused test hides the others.',
        },
      ],
    },
  },
  {
    files: ['libs/*/src/**/*.ts'],
    ignores: ['**/*.test.ts', '**/testing/**'],
    rules: { 'no-restricted-syntax': ['error', ...impure] },
  },
  {
    files: ['apps/api/**/*.ts'],
    // Nest reads constructor types at run time, so their imports must stay values.
    rules: { '@typescript-eslint/consistent-type-imports': 'off' },
  },
  {
    files: ['apps/web/src/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': hooks, i18next },
    rules: {
      ...hooks.configs.recommended.rules,
      'i18next/no-literal-string': ['error', { mode: 'jsx-text-only' }],
    },
  },
  {
    files: ['**/*.test.{ts,tsx}', '**/*.spec.ts', '**/testing/**'],
    rules: {
      '@typescript-eslint/no-non-null-assertion': 'off',
      'i18next/no-literal-string': 'off',
    },
  },
  {
    files: ['tools/**', '*.config.*', '**/*.mjs', '**/*.cjs'],
    languageOptions: { globals: readonly('process console URL fetch performance setTimeout') },
    rules: { 'no-console': 'off', '@typescript-eslint/no-require-imports': 'off' },
  },
  {
    files: ['**/*.cjs'],
    languageOptions: { globals: readonly('module require __dirname') },
  },
  {
    files: ['**/*.test.mjs'],
    languageOptions: { globals: readonly('describe it expect beforeEach afterEach') },
  },
  // Plain tables of data may be as long as the data is.
  {
    files: ['libs/demo/src/plans/**', 'libs/harness/src/reference/**', 'apps/web/src/i18n/**'],
    rules: { 'max-lines': 'off' },
  },
);
