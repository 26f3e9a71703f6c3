import path from 'node:path';
import { fileURLToPath } from 'node:url';
import js from '@eslint/js';
import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';
import { apiArrows, packageArrows, webArrows } from './import-arrows.mjs';

const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..');

/** What Node gives every script without an import. */
const nodeGlobals = Object.fromEntries(
  [
    'AbortController',
    'AbortSignal',
    'BroadcastChannel',
    'Buffer',
    'Headers',
    'ReadableStream',
    'Request',
    'Response',
    'TextDecoder',
    'TextEncoder',
    'TransformStream',
    'URL',
    'WritableStream',
    'clearInterval',
    'clearTimeout',
    'console',
    'fetch',
    'performance',
    'process',
    'setInterval',
    'setTimeout',
    'structuredClone',
  ].map((name) => [name, 'readonly']),
);

const tests = [
  '**/*.spec.ts',
  '**/*.spec.tsx',
  '**/*.testing.ts',
  '**/src/test/**',
  '**/src/testing/**',
  'apps/api/test/**',
];

/** Rules that need to know types: promises nobody waits for are how errors get lost. */
const typed = {
  files: ['apps/*/src/**/*.ts', 'apps/web/src/**/*.tsx', 'packages/*/src/**/*.ts'],
  ignores: tests,
  languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: root } },
  rules: {
    '@typescript-eslint/await-thenable': 'error',
    '@typescript-eslint/no-floating-promises': 'error',
    '@typescript-eslint/no-misused-promises': [
      'error',
      { checksVoidReturn: { attributes: false, arguments: false } },
    ],
    '@typescript-eslint/only-throw-error': 'error',
    '@typescript-eslint/switch-exhaustiveness-check': 'error',
  },
};

export default tseslint.config(
  {
    basePath: root,
    ignores: ['**/dist/**', '**/node_modules/**', '**/coverage/**', 'apps/web/src/lib/api/schema.d.ts'],
  },
  js.configs.recommended,
  ...tseslint.configs.recommended,
  {
    basePath: root,
    linterOptions: { reportUnusedDisableDirectives: 'error' },
    rules: {
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      'max-lines': ['error', { max: 400 }],
      'no-empty': ['error', { allowEmptyCatch: false }],
      'no-warning-comments': ['error', { terms: ['todo', 'fixme', 'xxx'], location: 'anywhere' }],
      '@typescript-eslint/ban-ts-comment': 'error',
      '@typescript-eslint/consistent-type-imports': [
        'error',
        { fixStyle: 'inline-type-imports', disallowTypeAnnotations: false },
      ],
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_', ignoreRestSiblings: true },
      ],
    },
  },
  { basePath: root, ...typed },
  { basePath: root, files: tests, rules: { '@typescript-eslint/no-explicit-any': 'off' } },
  {
    basePath: root,
    files: ['apps/api/**/*.ts'],
    rules: { '@typescript-eslint/consistent-type-imports': 'off' },
  },
  {
    basePath: root,
    files: ['**/*.mjs', '**/*.cjs', 'apps/web/public/*.js'],
    languageOptions: {
      globals: {
        ...nodeGlobals,
        document: 'readonly',
        localStorage: 'readonly',
        matchMedia: 'readonly',
        module: 'writable',
        require: 'readonly',
        __dirname: 'readonly',
      },
    },
    rules: { '@typescript-eslint/no-require-imports': 'off' },
  },
  {
    basePath: root,
    files: ['apps/web/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': reactHooks },
    rules: { 'react-hooks/rules-of-hooks': 'error', 'react-hooks/exhaustive-deps': 'error' },
  },
  ...[...packageArrows, ...apiArrows, ...webArrows].map((arrows) => ({ basePath: root, ...arrows })),
);
