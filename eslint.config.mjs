import js from '@eslint/js';
import jsxA11y from 'eslint-plugin-jsx-a11y';
import reactHooks from 'eslint-plugin-react-hooks';
import globals from 'globals';
import tseslint from 'typescript-eslint';

const tests = ['**/*.spec.ts', '**/*.spec.tsx', '**/*.e2e-spec.ts', '**/*.e2e.ts', '**/test/**', 'ui/e2e/**'];

const noFocusedTests = ['it', 'test', 'describe'].map((object) => ({
  object,
  property: 'only',
  message: 'A focused test hides the others: remove .only.',
}));

export default tseslint.config(
  { ignores: ['**/dist/**', '**/node_modules/**', '**/.data/**', 'ui/test-results/**', 'ui/playwright-report/**'] },
  js.configs.recommended,
  {
    files: ['**/*.ts', '**/*.tsx', '**/*.mts'],
    extends: [...tseslint.configs.recommendedTypeChecked],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/consistent-type-imports': [
        'error',
        { fixStyle: 'separate-type-imports', disallowTypeAnnotations: false },
      ],
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      // Arrays of checks and handlers keep their receivers: valibot pipes are plain functions.
      '@typescript-eslint/unbound-method': 'off',
    },
  },
  {
    // Nest reads constructor parameter types at run time: a type-only import there would erase them.
    files: ['api/**/*.ts'],
    rules: { '@typescript-eslint/consistent-type-imports': 'off' },
  },
  {
    rules: {
      'max-lines': ['error', { max: 300, skipBlankLines: true, skipComments: true }],
      'max-lines-per-function': ['error', { max: 60, skipBlankLines: true, skipComments: true }],
      'no-restricted-properties': [
        'error',
        ...noFocusedTests,
        { object: 'process', property: 'env', message: 'Read the environment in api/src/config/env.ts.' },
      ],
      eqeqeq: 'error',
    },
  },
  {
    files: ['ui/**/*.ts', 'ui/**/*.tsx'],
    extends: [jsxA11y.flatConfigs.recommended],
    plugins: { 'react-hooks': reactHooks },
    languageOptions: { globals: globals.browser },
    rules: {
      ...reactHooks.configs.recommended.rules,
      'max-lines-per-function': ['error', { max: 120, skipBlankLines: true, skipComments: true }],
      'jsx-a11y/label-has-associated-control': [
        'error',
        { assert: 'either', controlComponents: ['TextField.Root', 'TextArea', 'Select.Root'] },
      ],
      'no-restricted-imports': [
        'error',
        {
          paths: [
            {
              name: '@brimgate/reference-tables/feedstuffs',
              message: 'The feedstuff table is large: ask the API for what the page needs.',
            },
            { name: 'd3', message: 'Import from the D3 module that is needed (d3-scale, d3-shape, …).' },
          ],
        },
      ],
    },
  },
  {
    files: ['**/*.mjs', '**/*.cjs', '**/*.js'],
    languageOptions: { globals: globals.node },
    rules: { 'no-restricted-properties': ['error', ...noFocusedTests] },
  },
  {
    files: ['ui/public/**/*.js'],
    languageOptions: { globals: globals.browser },
  },
  {
    files: ['api/src/config/**', 'ui/e2e/**', 'api/test/**', 'api/jest.config.*', '**/*.config.*'],
    rules: { 'no-restricted-properties': ['error', ...noFocusedTests] },
  },
  {
    files: tests,
    rules: { 'max-lines': ['error', 400], 'max-lines-per-function': 'off' },
  },
  {
    files: ['api/src/database/seeds/**', 'api/src/database/migrations/**'],
    rules: { 'max-lines': 'off', 'max-lines-per-function': 'off' },
  },
);
