import path from 'node:path';
import { fileURLToPath } from 'node:url';
import nextVitals from 'eslint-config-next/core-web-vitals';
import nextTypescript from 'eslint-config-next/typescript';

const root = path.dirname(fileURLToPath(import.meta.url));
const domains = [
  'brine',
  'road',
  'treatment',
  'pavement',
  'routing',
  'ledger',
  'geo',
  'units',
  'time',
  'skerrow',
  'readings',
];
const pure = [...domains.map((domain) => `./lib/${domain}`), './lib/permissions.ts', './lib/problem.ts'];
const zone = (target, from, message) => ({ target, from, message });

/** Who may import whom: the table of DEVELOPERS.md, as one rule that resolves paths. */
const zones = [
  ...pure.map((target) =>
    zone(
      target,
      ['./app', './components', './db', './lib/server', './lib/client', './lib/contracts'],
      'pure lib imports pure lib only',
    ),
  ),
  zone(
    './lib/contracts',
    ['./app', './components', './db', './lib/server', './lib/client'],
    'contracts import pure lib and zod',
  ),
  zone('./db', ['./app', './components', './lib/client'], 'db imports pure lib, contracts and lib/server/env'),
  zone('./db', './lib/server', 'db imports nothing of lib/server but env'),
  zone(
    './lib/server',
    ['./app', './components', './lib/client', './db/models'],
    'lib/server reaches the database through queries and commands',
  ),
  zone('./lib/client', ['./app', './components', './db', './lib/server'], 'lib/client imports pure lib and contracts'),
  zone('./components', ['./app', './db', './lib/server', './lib/client'], 'components get props and give events'),
  zone('./app', ['./db/models', './db/connection.ts'], 'app reaches the database through queries and commands'),
].map((entry) =>
  entry.target === './db' && entry.from === './lib/server' ? { ...entry, except: ['./env.ts'] } : entry,
);

const nodeBuiltIns = ['fs', 'path', 'os', 'child_process', 'crypto', 'stream', 'http', 'node:*'];

const config = [
  {
    ignores: ['.next/**', '.next-spare/**', '.data/**', 'node_modules/**', 'coverage/**', 'next-env.d.ts', 'public/**'],
  },
  ...nextVitals,
  ...nextTypescript,
  {
    files: ['**/*.ts', '**/*.tsx', '**/*.mts'],
    languageOptions: { parserOptions: { projectService: true, tsconfigRootDir: root } },
    rules: {
      'import/no-restricted-paths': ['error', { zones, basePath: root }],
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-non-null-assertion': 'error',
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/require-array-sort-compare': ['error', { ignoreStringArrays: true }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
    },
  },
  {
    files: domains.map((domain) => `lib/${domain}/**/*.ts`).concat('lib/permissions.ts', 'lib/problem.ts'),
    ignores: ['**/*.test.ts'],
    rules: {
      'no-restricted-imports': [
        'error',
        {
          patterns: [
            {
              group: ['react', 'react-dom', 'next', 'next/*', 'sequelize', 'pg', ...nodeBuiltIns],
              message: 'pure lib has no I/O',
            },
          ],
        },
      ],
      'no-restricted-globals': ['error', 'process', 'fetch', 'window', 'document'],
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'random', message: 'randomness comes in as a seed' },
        { object: 'Date', property: 'now', message: 'time comes in as an argument' },
      ],
    },
  },
  {
    files: ['app/**/*.{ts,tsx}', 'lib/server/**/*.ts'],
    rules: {
      'no-restricted-imports': [
        'error',
        { patterns: [{ group: ['sequelize'], message: 'the database is reached through db/queries and db/commands' }] },
      ],
    },
  },
  {
    files: ['components/**/*.{ts,tsx}', 'app/**/*.{ts,tsx}'],
    ignores: ['components/map/**'],
    rules: {
      'no-restricted-imports': [
        'error',
        {
          patterns: [
            { group: ['leaflet', 'react-leaflet', 'sequelize'], message: 'Leaflet is one island: components/map' },
          ],
        },
      ],
    },
  },
  {
    files: ['lib/**/*.ts', 'app/**/*.{ts,tsx}', 'components/**/*.{ts,tsx}', 'db/**/*.ts'],
    ignores: ['lib/server/env.ts', '**/*.test.ts', '**/*.test.tsx'],
    rules: {
      'no-restricted-syntax': [
        'error',
        {
          selector: "MemberExpression[object.name='process'][property.name='env']",
          message: 'lib/server/env.ts is the only reader of process.env',
        },
      ],
    },
  },
];
export default config;
