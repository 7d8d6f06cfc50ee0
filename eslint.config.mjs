import js from '@eslint/js';
import reactHooks from 'eslint-plugin-react-hooks';
import globals from 'globals';
import tseslint from 'typescript-eslint';

/** Forbids imports by pattern, with the reason that the reader sees. */
const forbid = (...rules) => ({
  'no-restricted-imports': ['error', { patterns: rules.map(([regex, message]) => ({ regex, message })) }],
});

const toOtherPart = (names) => `(^|/)(${names})(/|$)`;
const fakes = ['@linkfell/fake-|(^|/)fakes/', 'Nothing under apps/ knows that it talks to a stand-in.'];
const server = [
  '^@linkfell/(api|db)|(^|/)apps/api/|(^|/)db/',
  'The web app knows the server by its contracts only.',
];
const toApp = [`^\\.{1,2}/(.*/)?app/`, 'Only app/ composes pages: nothing below may import from it.'];
const toFeatures = [`^\\.{1,2}/(.*/)?features/`, 'Shared code does not know the features that use it.'];

export default tseslint.config(
  {
    ignores: [
      ...[
        '**/dist/',
        '**/node_modules/',
        '**/coverage/',
        '.local/',
        '**/test-results/',
        '**/playwright-report/',
      ],
    ],
  },
  { linterOptions: { reportUnusedDisableDirectives: 'error' } },
  js.configs.recommended,
  {
    files: ['**/*.{js,mjs,cjs}'],
    languageOptions: { globals: globals.node, ecmaVersion: 'latest' },
  },
  {
    files: ['**/*.{ts,tsx}'],
    extends: [tseslint.configs.recommended],
    languageOptions: {
      parserOptions: {
        // The same three programs as the type check of `npm test`, tests and tool settings included.
        project: ['libraries', 'api', 'web'].map((part) => `packages/launcher/types/${part}.json`),
        tsconfigRootDir: import.meta.dirname,
      },
    },
    rules: {
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
      '@typescript-eslint/await-thenable': 'error',
      '@typescript-eslint/switch-exhaustiveness-check': [
        'error',
        { considerDefaultExhaustiveForUnions: true, requireDefaultForNonUnion: false },
      ],
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/consistent-type-imports': 'off',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      eqeqeq: ['error', 'always', { null: 'ignore' }],
    },
  },
  {
    // describe.only would hide the other tests, and a skipped one proves nothing.
    files: ['**/*.{spec,test,e2e-spec}.{ts,tsx}', 'apps/web/e2e/**/*.ts'],
    rules: {
      'no-restricted-syntax': [
        'error',
        {
          selector: 'CallExpression[callee.property.name=/^(only|skip|todo|fixme|skipIf|runIf)$/]',
          message: 'Tests run, all of them.',
        },
      ],
    },
  },
  {
    files: ['packages/fit-engine/src/**/*.ts'],
    rules: forbid(
      ['^@linkfell/', 'The engine imports nothing of the workspace.'],
      [toOtherPart('contracts|apps|db|fakes'), 'The engine imports nothing of the workspace.'],
    ),
  },
  {
    files: ['packages/contracts/src/**/*.ts'],
    ignores: ['**/*.spec.ts', '**/*.test.ts'],
    rules: forbid(['^(?!\\.{1,2}/|zod($|/))', 'The contracts import zod only.']),
  },
  { files: ['apps/api/src/**/*.ts'], ignores: ['**/*.spec.ts'], rules: forbid(fakes) },
  {
    files: ['apps/web/**/*.{ts,tsx}'],
    extends: [reactHooks.configs.flat['recommended-latest'] ?? reactHooks.configs.flat.recommended],
    languageOptions: { globals: globals.browser },
  },
  { files: ['apps/web/src/**/*.{ts,tsx}'], rules: forbid(fakes, server) },
  {
    files: ['apps/web/src/{components,lib,theme}/**/*.{ts,tsx}'],
    rules: forbid(fakes, server, toApp, toFeatures),
  },
  { files: ['apps/web/src/features/**/*.{ts,tsx}'], rules: forbid(fakes, server, toApp) },
  {
    files: ['apps/web/e2e/**/*.ts'],
    // Playwright hands over its fixtures by a function called "use".
    rules: { 'react-hooks/rules-of-hooks': 'off', 'no-empty-pattern': 'off' },
  },
);
