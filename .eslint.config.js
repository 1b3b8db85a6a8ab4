import js from '@eslint/js';
import astro from 'eslint-plugin-astro';
import tseslint from 'typescript-eslint';

const scripts = ['**/*.{js,mjs}'];
const typescript = ['**/*.{ts,tsx}'];

/** Paths that climb out of a folder into one of these: `../server/x`, `../../db/models`. */
const folders = (...names) => `^(\\.\\./)+(src/)?(${names.join('|')})(/|$)`;

/** Every package but these; relative paths are left to `folders`. */
const packagesBut = (...names) => `^(?!\\.{1,2}/|(${names.join('|')})(/|$))`;

const DATABASE = '^(sequelize|pg|umzug)$';
const ZOD = '^zod(/|$)';

/** Imports run one way: lib ← schemas ← server, client ← pages, components; only server knows db. */
const layer = (files, ...forbidden) => ({
  files,
  rules: {
    'no-restricted-imports': [
      'error',
      { patterns: forbidden.map(([regex, message]) => ({ regex, message })) },
    ],
  },
});

const noZod = [ZOD, 'zod belongs to src/schemas.'];
const noDatabase = [DATABASE, 'Only src/server and db talk to the database.'];

const layers = [
  layer(
    ['src/lib/**'],
    [
      packagesBut('mathjs', '@stdlib', 'papaparse', 'pure-rand', 'culori'),
      'The library is pure: mathjs, @stdlib, papaparse, pure-rand and culori only.',
    ],
    [
      folders('schemas', 'server', 'client', 'components', 'layouts', 'pages', 'run', 'db'),
      'The library imports nothing outside src/lib.',
    ],
  ),
  layer(
    ['src/schemas/**'],
    [packagesBut('zod'), 'Schemas know zod and src/lib.'],
    [
      folders('server', 'client', 'components', 'layouts', 'pages', 'run', 'db'),
      'Schemas import only from src/lib.',
    ],
  ),
  layer(
    ['src/client/**', 'src/components/**', 'src/layouts/**'],
    [folders('server', 'pages', 'run', 'db'), 'What reaches a browser knows no server code.'],
    ['^node:', 'There is no Node in a browser.'],
    noDatabase,
    noZod,
  ),
  layer(
    ['src/server/**'],
    [folders('client', 'components', 'layouts', 'pages', 'run'), 'The server knows no page.'],
    noZod,
  ),
  layer(
    ['src/pages/**', 'src/middleware.ts'],
    [folders('run', 'db'), 'Pages reach rows through src/server.'],
    noDatabase,
    noZod,
  ),
  layer(
    ['db/{models,migrations}/**', 'db/*.ts'],
    [
      folders('server', 'client', 'components', 'layouts', 'pages', 'run'),
      'The database imports only from src/lib and src/schemas.',
    ],
    noZod,
  ),
  // A seeder fills the tables as the site does: through the commands of src/server.
  layer(
    ['db/seeders/**'],
    [folders('client', 'components', 'layouts', 'pages', 'run'), 'Seeders use src/server.'],
    noZod,
  ),
];

export default tseslint.config(
  { ignores: ['node_modules', 'dist', '.astro', '.ellwise', 'data', 'src/env.d.ts'] },
  js.configs.recommended,
  tseslint.configs.recommended,
  astro.configs.recommended,
  {
    rules: {
      eqeqeq: ['error', 'always', { null: 'ignore' }],
      'no-console': 'off',
      'no-var': 'error',
      'prefer-const': 'error',
      // `declare global { var … }` is how TypeScript names a global.
      'no-undef': 'off',
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_' },
      ],
      '@typescript-eslint/consistent-type-imports': [
        'error',
        { fixStyle: 'inline-type-imports', disallowTypeAnnotations: false },
      ],
    },
  },
  {
    // A promise nobody waits for loses its error: worth the time that reading types takes.
    files: ['src/**/*.{ts,tsx}', 'db/**/*.ts', 'tests/**/*.{ts,tsx}'],
    languageOptions: { parserOptions: { projectService: true } },
    rules: {
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/no-misused-promises': [
        'error',
        { checksVoidReturn: { attributes: false } },
      ],
      '@typescript-eslint/await-thenable': 'error',
    },
  },
  { files: typescript, rules: { 'no-var': 'off' } },
  { files: scripts, rules: { 'no-undef': 'error' }, languageOptions: { globals: nodeGlobals() } },
  {
    files: ['public/*.js'],
    languageOptions: { globals: { self: 'readonly', caches: 'readonly' } },
  },
  ...layers,
);

function nodeGlobals() {
  const timers = ['setTimeout', 'clearTimeout', 'setInterval', 'clearInterval'];
  const names = [...timers, 'AbortSignal', 'Buffer', 'URL', 'console', 'fetch', 'process'];
  return Object.fromEntries(names.map((name) => [name, 'readonly']));
}
