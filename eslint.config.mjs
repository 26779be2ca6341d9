// @ts-check
import eslint from '@eslint/js';
import { createTypeScriptImportResolver } from 'eslint-import-resolver-typescript';
import importX from 'eslint-plugin-import-x';
import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';
import { walls } from './api/ops/lint/walls.mjs';

const tests = ['**/*.spec.ts', '**/*.spec.tsx', '**/e2e/**/*.ts', 'api/test/**/*.ts'];

export default tseslint.config(
  {
    ignores: ['**/dist/**', '**/node_modules/**', '.data/**', '.test-data/**', 'api/ops/lint/violations/**'],
  },
  eslint.configs.recommended,
  ...tseslint.configs.recommendedTypeChecked,
  {
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    plugins: { 'import-x': importX },
    // Without this resolver the walls find nothing, and say nothing: see api/ops/lint/walls.spec.ts.
    settings: {
      'import-x/resolver-next': [
        createTypeScriptImportResolver({ conditionNames: ['source', 'types', 'import', 'require'] }),
      ],
    },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      // `import { type A }` leaves an empty import behind, which fetches the file all the same.
      '@typescript-eslint/no-import-type-side-effects': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_' }],
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      'import-x/no-restricted-paths': ['error', { basePath: import.meta.dirname, zones: walls }],
      'no-restricted-syntax': [
        'error',
        {
          selector:
            'CallExpression[callee.object.name=/^(it|test|describe)$/][callee.property.name=/^(only|skip|todo)$/]',
          message: 'No focused or skipped tests.',
        },
      ],
      eqeqeq: 'error',
    },
  },
  {
    files: ['api/**/*.ts'],
    rules: {
      // Nest reads constructor parameter types at run time: a type-only import would erase them.
      '@typescript-eslint/consistent-type-imports': 'off',
      'no-restricted-syntax': [
        'error',
        {
          selector: "CallExpression[callee.property.name='save'][arguments.length>0]",
          message: 'No save(): a stale save silently writes old values back. Compare and set on the version.',
        },
        {
          selector:
            'CallExpression[callee.object.name=/^(it|test|describe)$/][callee.property.name=/^(only|skip|todo)$/]',
          message: 'No focused or skipped tests.',
        },
      ],
    },
  },
  {
    files: ['site/**/*.{ts,tsx}', 'admin/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': reactHooks },
    rules: reactHooks.configs.recommended.rules,
  },
  {
    files: tests,
    rules: {
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/no-unsafe-argument': 'off',
      '@typescript-eslint/no-unsafe-call': 'off',
    },
  },
  {
    files: ['shared/src/**/*.ts'],
    ignores: ['**/*.spec.ts', 'shared/src/testing/**'],
    rules: {
      'no-restricted-imports': [
        'error',
        {
          patterns: [
            {
              regex: '^(?!\\.{1,2}/|(zod|fraction\\.js|@edtf-ts/core)$)',
              message:
                'shared knows no framework and does no I/O: it imports itself, zod, fraction.js and @edtf-ts/core.',
            },
          ],
        },
      ],
    },
  },
  {
    files: ['api/src/catalogue/**/*.ts'],
    rules: {
      'no-restricted-imports': [
        'error',
        {
          paths: [
            {
              name: '@nestjs/typeorm',
              message:
                'Unnamed, it hands out the account of the Workroom: take the connection from common/catalogue-connection.',
            },
          ],
        },
      ],
    },
  },
  // tsc reads these files too (checkJs) and knows Node's globals; ESLint's own list would have to be kept by hand.
  { files: ['**/*.mjs', '**/*.cjs'], rules: { 'no-undef': 'off' } },
);
