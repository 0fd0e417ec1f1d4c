import reactHooks from 'eslint-plugin-react-hooks';
import { defineConfig } from 'eslint/config';
import tseslint from 'typescript-eslint';
import { fileNameRule } from './lint/file-name-rule.js';
import { oneDoorConfigs } from './lint/one-door.js';
import { restrictedSyntax } from './lint/restricted-syntax.js';

const typescript = ['**/*.ts', '**/*.tsx'];
const plainJavaScript = ['**/*.js', '**/*.mjs', '**/*.cjs'];
const tests = ['**/*.test.ts', '**/*.test.tsx', 'tests/**'];

const sizes = {
  'max-lines': ['error', { max: 250, skipBlankLines: false, skipComments: false }],
  'max-lines-per-function': ['error', { max: 60 }],
  complexity: ['error', 10],
  'max-params': ['error', 4],
};

const everywhere = {
  'leeside/file-name': 'error',
  'no-warning-comments': ['error', { terms: ['todo', 'fixme', 'xxx'], location: 'anywhere' }],
  eqeqeq: ['error', 'always'],
  'no-console': 'off',
  ...sizes,
  ...restrictedSyntax(),
};

const typed = {
  '@typescript-eslint/no-floating-promises': 'error',
  '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
  '@typescript-eslint/no-explicit-any': 'error',
  '@typescript-eslint/ban-ts-comment': ['error', { 'ts-ignore': true, 'ts-nocheck': true, 'ts-expect-error': 'allow-with-description' }],
  '@typescript-eslint/switch-exhaustiveness-check': ['error', { considerDefaultExhaustiveForUnions: true }],
  '@typescript-eslint/consistent-type-imports': 'error',
  '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_', ignoreRestSiblings: true }],
  // A port's method is asynchronous for the sake of the other adapters, whether or not this one waits.
  '@typescript-eslint/require-await': 'off',
};

// In tests the answers of libraries that type them as any (supertest's body) are looked at freely.
const looserInTests = {
  'max-lines-per-function': 'off',
  '@typescript-eslint/no-unsafe-assignment': 'off',
  '@typescript-eslint/no-unsafe-member-access': 'off',
  '@typescript-eslint/no-unsafe-argument': 'off',
  '@typescript-eslint/no-unsafe-return': 'off',
  '@typescript-eslint/no-unsafe-call': 'off',
  'no-restricted-imports': 'off',
  ...restrictedSyntax({ mayConvert: true, mayReadEnvironment: true }),
};

export default defineConfig(
  { ignores: ['**/node_modules/**', '**/dist/**', '**/dist-types/**', '**/coverage/**', '.data/**'] },
  // A comment cannot switch a rule off.
  { linterOptions: { noInlineConfig: true } },
  { plugins: { leeside: { rules: { 'file-name': fileNameRule } } } },
  {
    files: typescript,
    extends: [tseslint.configs.recommendedTypeChecked],
    languageOptions: { parserOptions: { project: './tsconfig.lint.json', tsconfigRootDir: import.meta.dirname } },
    rules: typed,
  },
  { rules: everywhere },
  {
    files: plainJavaScript,
    rules: { 'no-unused-vars': 'error', 'no-const-assign': 'error', 'no-dupe-keys': 'error', 'no-unreachable': 'error' },
  },
  { files: ['**/*.tsx'], rules: { 'max-lines-per-function': ['error', { max: 90 }] } },
  { files: ['apps/web/**/*.{ts,tsx}'], extends: [reactHooks.configs.flat.recommended] },
  ...oneDoorConfigs(),
  { files: ['packages/units/src/**'], rules: restrictedSyntax({ mayConvert: true }) },
  {
    files: ['apps/*/src/configuration.ts', 'docker-less-scripts/**', '*.config.{ts,js}', 'apps/*/*.config.{ts,js}'],
    rules: restrictedSyntax({ mayReadEnvironment: true }),
  },
  // Knex gives the rows of raw SQL as any; the type of a row is written beside its query, and goes no further than this package.
  { files: ['packages/database/src/**'], rules: { '@typescript-eslint/no-unsafe-assignment': 'off' } },
  { files: tests, rules: looserInTests },
);
