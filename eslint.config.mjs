import coreWebVitals from 'eslint-config-next/core-web-vitals';
import typescript from 'eslint-config-next/typescript';

/**
 * Who may import whom. Each layer lists what it must not reach; DEVELOPERS.md has the table.
 * `only` layers (lib, db, jobs) may use the named packages and nothing else.
 */
const layer = (files, patterns, ignores = []) => ({
  files,
  ignores,
  rules: { 'no-restricted-imports': ['error', { patterns }] },
});

const onlyPackages = (allowed, why) => ({
  regex: `^(?!${allowed.map((name) => name.replace(/[/.]/g, '\\$&')).join('|')}|\\.{1,2}/|node:)[@a-z]`,
  message: why,
});

const noParents = (folders, why) => ({
  regex: `^(@/|(\\.\\./)+)(${folders.join('|')})(/|$)`,
  message: why,
});

const config = [
  { ignores: ['.next/**', 'node_modules/**', 'data/**', 'tests/.out/**', 'next-env.d.ts', 'db/migrations/**'] },
  ...coreWebVitals,
  ...typescript,
  {
    rules: {
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      '@typescript-eslint/consistent-type-imports': ['error', { fixStyle: 'inline-type-imports' }],
      'no-console': ['error', { allow: ['warn', 'error'] }],
      eqeqeq: 'error',
    },
  },
  layer(
    ['lib/**'],
    [
      noParents(['app', 'components', 'db', 'jobs', 'tests'], 'lib is the pure core: it imports lib and pure packages only.'),
      { regex: '^node:', message: 'lib does no I/O.' },
      onlyPackages(
        ['@/lib/', 'zod', 'rrule', 'suncalc', 'date-fns', '@date-fns/tz', '@photostructure/tz-lookup'],
        'lib may use zod, rrule, suncalc, date-fns and the time-zone table only.',
      ),
    ],
  ),
  layer(
    ['db/**'],
    [
      noParents(['app', 'components', 'jobs', 'tests'], 'db imports lib and the database packages only.'),
      onlyPackages(
        ['@/lib/', '@/db/', 'drizzle-orm', 'drizzle-kit', 'better-sqlite3', '@auth/drizzle-adapter', '@node-rs/argon2'],
        'db may use drizzle, better-sqlite3, the auth adapter and argon2 (seed) only.',
      ),
    ],
  ),
  layer(
    ['jobs/**'],
    [
      noParents(['app', 'components', 'tests'], 'jobs import lib, db and mail packages only.'),
      onlyPackages(['@/lib/', '@/db/', '@/jobs/', 'nodemailer', 'smtp-server', 'mailparser'], 'jobs may use nodemailer, smtp-server and mailparser only.'),
    ],
  ),
  layer(
    ['components/**'],
    [noParents(['app', 'db', 'jobs', 'tests'], 'components import lib, react and UI packages; data comes in as props.')],
  ),
  layer(
    ['app/**'],
    [
      noParents(['tests'], 'app never imports tests.'),
      { regex: '^@/db/(?!queries/|auth-adapter$)', message: 'app reads and writes through db/queries, never tables or the client.' },
    ],
  ),
  // `useFreshDatabase` is a test set-up, not a React hook.
  { files: ['tests/integration/**', 'tests/bench/**'], rules: { 'react-hooks/rules-of-hooks': 'off' } },
  { files: ['jobs/**', 'tests/setup/**', 'db/migrate.ts', 'db/seed.ts'], rules: { 'no-console': 'off' } },
];

export default config;
