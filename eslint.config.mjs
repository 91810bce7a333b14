// The linter's rules. A later block replaces a rule's options, so each rule is set in one place for each file.
import { createTypeScriptImportResolver } from 'eslint-import-resolver-typescript';
import { defineConfig } from 'eslint/config';
import importX from 'eslint-plugin-import-x';
import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';
import { importsRule } from './eslint.imports.mjs';

const source = ['**/*.{ts,tsx,mjs,cjs,js}'];
const core = ['sequence', 'structure', 'permissions', 'scenario'].map((name) => `shared/${name}/**/*.ts`);
const purity = 'The core is pure: no clock, no chance, no network. Take the value as a parameter.';

const transactions = [
  {
    selector: "CallExpression[callee.property.name='transaction']",
    message: 'Use the unit of work of server/db: it locks, retries and announces.',
  },
  {
    selector: "CallExpression[callee.property.name='createQueryRunner']",
    message: 'Use the unit of work of server/db: a query runner that is not released hangs the server.',
  },
];
const impure = [
  { selector: "MemberExpression[object.name='Math'][property.name='random']", message: purity },
  { selector: "MemberExpression[object.name='Date'][property.name='now']", message: purity },
  { selector: "NewExpression[callee.name='Date'][arguments.length=0]", message: purity },
];
const colours = [
  {
    selector: 'Literal[value=/^#([0-9a-fA-F]{3,4}|[0-9a-fA-F]{6}|[0-9a-fA-F]{8})$/]',
    message: 'No colour literal in a screen: use a token of components/theme.',
  },
];

export default defineConfig(
  {
    ignores: ['node_modules', '.data', '.expo', 'dist', 'coverage', 'tests/fixtures', 'expo-env.d.ts'],
  },
  { linterOptions: { noInlineConfig: true } },
  ...tseslint.configs.recommended,
  {
    files: source,
    plugins: { 'import-x': importX, locant: { rules: { imports: importsRule } } },
    settings: {
      'import-x/resolver-next': [createTypeScriptImportResolver({ project: './tsconfig.json' })],
      'import-x/parsers': { '@typescript-eslint/parser': ['.ts', '.tsx'] },
      'import-x/extensions': ['.ts', '.tsx', '.mjs'],
    },
    rules: {
      'locant/imports': 'error',
      'import-x/no-cycle': ['error', { ignoreExternal: true }],
      'import-x/no-duplicates': 'error',
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-require-imports': 'off',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      eqeqeq: ['error', 'always'],
      'no-console': 'off',
    },
  },
  {
    files: ['**/*.{ts,tsx}'],
    rules: { '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }] },
  },
  {
    files: source,
    ignores: ['tests/**', 'bench/**', '**/*.data.ts', 'server/db/migrations/**'],
    rules: { 'max-lines': ['error', { max: 300 }] },
  },
  {
    files: ['{app,features,components,client}/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': reactHooks },
    rules: { 'react-hooks/rules-of-hooks': 'error', 'react-hooks/exhaustive-deps': 'error' },
  },
  {
    files: core,
    rules: {
      'no-restricted-syntax': ['error', ...impure],
      'no-restricted-globals': [
        'error',
        ...['fetch', 'process', 'window', 'document', 'Buffer', 'setTimeout', 'console'].map((name) => ({
          name,
          message: purity,
        })),
      ],
    },
  },
  {
    files: ['{app,features}/**/*.{ts,tsx}'],
    rules: {
      'no-restricted-syntax': ['error', ...colours],
      'no-restricted-globals': [
        'error',
        {
          name: 'fetch',
          message: 'Call the endpoint of a contract through client/api: it is the only fetch.',
        },
      ],
    },
  },
  {
    files: ['server/**/*.ts'],
    ignores: ['server/db/**'],
    rules: { 'no-restricted-syntax': ['error', ...transactions] },
  },
);
