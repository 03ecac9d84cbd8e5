import next from 'eslint-config-next/core-web-vitals';
import nextTypescript from 'eslint-config-next/typescript';
import { arrowsRule } from './scripts/lint/arrows-rule.mjs';
import { coreFolders } from './scripts/lint/arrows.mjs';

const pureMessage = 'The core is pure: take it as an argument.';
const envMessage = 'Only lib/env.ts reads process.env.';

const readsEnv = [{ selector: "MemberExpression[object.name='process'][property.name='env']", message: envMessage }];
const impure = [
  { selector: "NewExpression[callee.name='Date'][arguments.length=0]", message: pureMessage },
  { selector: "CallExpression[callee.name='Date']", message: pureMessage },
  { selector: "MemberExpression[object.name='Date'][property.name='now']", message: pureMessage },
  { selector: "MemberExpression[object.name='Math'][property.name='random']", message: pureMessage },
];
const unfair = [
  {
    selector: 'MemberExpression[object.name=/^(it|test|describe)$/][property.name=/^(skip|only|todo|skipIf|runIf)$/]',
    message: 'Every test runs, always.',
  },
];
const worldly = [
  'process',
  'window',
  'document',
  'localStorage',
  'fetch',
  'performance',
  'crypto',
  'setTimeout',
  'setInterval',
];

const product = ['app/**', 'components/**', 'db/**', 'lib/**', 'migrations/**', 'seeds/**', 'proxy.ts'];
const core = coreFolders.flatMap((name) => [`${name}.ts`, `${name}/**/*.{ts,tsx}`]);

const config = [
  {
    ignores: [
      '.next/**',
      '.next-test/**',
      '.local/**',
      'node_modules/**',
      'coverage/**',
      'next-env.d.ts',
      'public/**',
      'tests/fixtures/**/*.mjs',
    ],
  },
  ...next,
  ...nextTypescript,
  {
    files: ['**/*.{ts,tsx,mjs}'],
    plugins: { twobow: { rules: { arrows: arrowsRule } } },
    rules: {
      'max-lines': ['error', { max: 300 }],
      eqeqeq: 'error',
      'no-console': 'error',
      'twobow/arrows': 'error',
    },
  },
  {
    files: ['**/*.{ts,tsx}'],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/await-thenable': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', ignoreRestSiblings: true }],
    },
  },
  { files: product, ignores: ['lib/env.ts'], rules: { 'no-restricted-syntax': ['error', ...readsEnv] } },
  {
    files: core,
    rules: {
      'no-restricted-syntax': ['error', ...readsEnv, ...impure],
      'no-restricted-globals': ['error', ...worldly.map((name) => ({ name, message: pureMessage }))],
    },
  },
  { files: ['tests/**'], rules: { 'no-restricted-syntax': ['error', ...unfair] } },
  { files: ['scripts/**', 'seeds/**'], rules: { 'no-console': 'off' } },
];

export default config;
