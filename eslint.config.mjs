import { defineConfig, globalIgnores } from 'eslint/config';
import nextVitals from 'eslint-config-next/core-web-vitals';
import nextTs from 'eslint-config-next/typescript';
import prettier from 'eslint-config-prettier/flat';

const CORE = [
  'lib/{units,physics,sun,weather,simulation,testbench,calibration,economics,sizing,checks}/**/*.ts',
];

/** The same streets as .dependency-cruiser.cjs, which is the gate; here they show while one types. */
const street = (files, group, message) => ({
  files,
  rules: { 'no-restricted-imports': ['error', { patterns: [{ group, message }] }] },
});

const PAGES_AND_PARTS = ['@/app/*', '@/components/*', '@/workers/*', '@/tests/*'];
const FRAMEWORK = ['react', 'react-dom', 'react/*', 'next', 'next/*', 'next-auth', 'next-auth/*'];
const DATABASE = ['@/db/*', '@/migrations/*', 'pg', 'kysely'];

const streets = [
  street(
    ['lib/**/*.ts'],
    [...PAGES_AND_PARTS, ...FRAMEWORK, ...DATABASE, 'server-only'],
    'lib knows neither React nor Next nor SQL.',
  ),
  street(
    ['lib/server/**/*.ts', 'lib/auth/**/*.ts'],
    PAGES_AND_PARTS,
    'lib knows nothing of pages and their parts.',
  ),
  street(
    CORE,
    [
      ...PAGES_AND_PARTS,
      ...FRAMEWORK,
      ...DATABASE,
      'node:*',
      'zod',
      '@/lib/{schemas,server,auth,mail,study}/*',
    ],
    'The core stands alone: no framework, no Node, no database, no schemas.',
  ),
  street(
    ['components/**/*.{ts,tsx}'],
    ['@/app/*', ...DATABASE, '@/lib/server/*', '@/lib/auth/*', '@/tests/*'],
    'Components draw what they are handed.',
  ),
  street(
    ['app/**/*.{ts,tsx}'],
    [...DATABASE, '@/tests/*'],
    'Pages and actions reach the database through lib/server.',
  ),
  street(
    ['workers/**/*.ts'],
    ['@/app/*', '@/components/*', '@/tests/*', ...FRAMEWORK, ...DATABASE, '@/lib/server/*', '@/lib/auth/*'],
    'Workers run the core and nothing else.',
  ),
  street(
    ['db/**/*.ts', 'migrations/**/*.ts'],
    [...PAGES_AND_PARTS, ...FRAMEWORK, '@/lib/server/*'],
    'The database layer knows no pages and decides nothing.',
  ),
];

export default defineConfig([
  globalIgnores(['.next/**', '.postgres/**', '.local/**', 'next-env.d.ts', 'coverage/**', 'test-results/**']),
  ...nextVitals,
  ...nextTs,
  prettier,
  {
    rules: {
      eqeqeq: 'error',
      'no-console': 'error',
      'object-shorthand': 'error',
      'prefer-const': 'error',
    },
  },
  {
    files: ['**/*.ts', '**/*.tsx'],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname } },
    rules: {
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/ban-ts-comment': ['error', { 'ts-expect-error': 'allow-with-description' }],
    },
  },
  {
    files: CORE,
    rules: {
      'no-restricted-globals': [
        'error',
        { name: 'performance', message: 'The core has no clock.' },
        { name: 'process', message: 'The core knows no environment.' },
        { name: 'window', message: 'The core runs in a worker and on the server.' },
        { name: 'document', message: 'The core runs in a worker and on the server.' },
        { name: 'fetch', message: 'The core is handed its inputs.' },
      ],
      'no-restricted-syntax': [
        'error',
        {
          selector: [
            "NewExpression[callee.name='Date'][arguments.length=0]",
            "CallExpression[callee.name='Date']",
            "MemberExpression[object.name='Date'][property.name='now']",
          ].join(', '),
          message: 'The core has no clock: take the instant as a number.',
        },
      ],
    },
  },
  {
    files: ['app/**/*.{ts,tsx}', 'components/**/*.{ts,tsx}', 'lib/**/*.ts'],
    ignores: ['lib/server/env.ts'],
    rules: {
      'no-restricted-properties': [
        'error',
        { object: 'process', property: 'env', message: 'lib/server/env.ts alone reads the environment.' },
        { object: 'Math', property: 'random', message: 'Seed it, or use crypto where it must be secret.' },
      ],
    },
  },
  // Their purpose is to print.
  { files: ['tests/bench/**/*.ts'], rules: { 'no-console': 'off' } },
  ...streets,
]);
