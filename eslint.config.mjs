import { existsSync, readdirSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import nextVitals from 'eslint-config-next/core-web-vitals';
import nextTypescript from 'eslint-config-next/typescript';

const root = fileURLToPath(new URL('.', import.meta.url));
const tests = ['**/*.test.ts', '**/*.test.tsx'];
const nodeBuiltins = ['node:*', 'fs', 'path', 'crypto', 'os', 'net', 'child_process', 'worker_threads', 'stream', 'url', 'util', 'http', 'https', 'buffer'];

/** The features there are, read from the folder: a new one obeys on the day it is made. */
const features = existsSync(`${root}features`)
  ? readdirSync(`${root}features`, { withFileTypes: true }).filter((entry) => entry.isDirectory()).map(({ name }) => name)
  : [];

const zone = (target, from, message, except) => ({ target, from, message, ...(except ? { except } : {}) });

/** app -> features -> components -> lib, and the models only where data is read and written. */
const zones = [
  zone('./lib', ['./app', './features', './components'], 'lib stands below: what it needs from above comes in as a value.'),
  zone('./components', ['./app', './features', './models', './lib/server'], 'components show what they are given: no features, no data.'),
  zone('./features', ['./app'], 'features are composed by pages, never the other way.'),
  zone('./app', ['./models'], 'pages and routes call a use case in features/<name>/server.'),
  zone('./models', ['./app', './features', './components'], 'models hold no rules of the trade.'),
  zone('./lib/domain', ['./lib/server', './lib/http', './lib/env.ts', './models'], 'the domain is pure: values in, values out.'),
  zone('./lib/http', ['./lib/server', './models'], 'lib/http runs in the browser too.'),
  ...features.map((name) => zone(`./features/${name}`, ['./features'], 'features do not import each other: move what two need down into lib, or compose them in a page.', [`./${name}`])),
  ...features.flatMap((name) =>
    [`./features/${name}/!(server)/**/*`, `./features/${name}/*`].map((part) =>
      zone(part, ['./models', './lib/server'], 'only features/<name>/server touches the database.'),
    ),
  ),
];

const config = [
  ...nextVitals,
  ...nextTypescript,
  { ignores: ['.next/**', '.data/**', 'node_modules/**', 'next-env.d.ts', 'test-results/**', 'playwright-report/**', 'coverage/**'] },
  {
    files: ['**/*.{ts,tsx,mjs}'],
    rules: {
      'max-lines': ['warn', { max: 250, skipBlankLines: true, skipComments: true }],
      'no-restricted-imports': 'off',
      'import/no-anonymous-default-export': 'off',
      'import/no-cycle': ['error', { maxDepth: 6, ignoreExternal: true }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_', ignoreRestSiblings: true }],
      '@typescript-eslint/no-unused-expressions': 'error',
      '@typescript-eslint/consistent-type-imports': ['error', { prefer: 'type-imports', disallowTypeAnnotations: false }],
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      'prefer-const': 'error',
    },
  },
  {
    files: ['**/*.{ts,tsx}'],
    ignores: tests,
    rules: { 'import/no-restricted-paths': ['error', { basePath: root, zones }] },
  },
  {
    files: ['app/**', 'features/**', 'components/**', 'lib/**', 'models/**'],
    ignores: tests,
    rules: {
      'no-console': 'error',
      'no-restricted-syntax': [
        'error',
        { selector: "MemberExpression[object.name='process'][property.name='env']", message: 'Settings are read in lib/env.ts alone.' },
        { selector: "ImportExpression[source.value='next-auth/react'], ImportDeclaration[source.value='next-auth/react']", message: 'It costs 11 kB on every page; sign-in and sign-out are plain requests.' },
      ],
    },
  },
  {
    files: ['lib/env.ts'],
    rules: { 'no-restricted-syntax': 'off' },
  },
  {
    files: ['lib/domain/**/*.{ts,tsx}'],
    ignores: tests,
    rules: {
      'no-restricted-imports': [
        'error',
        {
          paths: nodeBuiltins.filter((name) => !name.includes('*')).map((name) => ({ name, message: 'The domain runs in the browser, in a worker and on the server: no Node built-ins.' })),
          patterns: [
            { group: ['node:*'], message: 'The domain runs in the browser, in a worker and on the server: no Node built-ins.' },
            { group: ['react', 'react-dom', 'react/*', 'react-dom/*', 'next', 'next/*', 'next-auth', 'next-auth/*'], message: 'The domain knows no screen.' },
            { group: ['sequelize', 'sequelize/*', 'mariadb', 'server-only'], message: 'The domain knows no database.' },
          ],
        },
      ],
      'no-restricted-globals': ['error', 'window', 'document', 'process', 'localStorage', 'fetch'],
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'random', message: 'Chance is a parameter.' },
        { object: 'Date', property: 'now', message: 'The clock is a parameter.' },
      ],
    },
  },
  {
    files: [...tests, 'tests/**/*.{ts,tsx}'],
    rules: {
      'no-restricted-syntax': [
        'error',
        { selector: "CallExpression[callee.object.name=/^(test|it|describe)$/][callee.property.name=/^(only|skip|todo|fixme)$/]", message: 'Every test runs.' },
      ],
      'no-empty-pattern': 'off',
      'react-hooks/rules-of-hooks': 'off',
    },
  },
  {
    files: ['scripts/**/*.mjs', 'tests/**/*.{ts,tsx}', '*.config.{ts,mjs}', 'seeders/**', 'migrations/**', 'scripts/**/*.ts'],
    rules: { 'import/no-cycle': 'off' },
  },
];

export default config;
