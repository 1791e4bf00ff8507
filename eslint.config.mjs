import expo from 'eslint-config-expo/flat.js';
import tseslint from 'typescript-eslint';

/** What each top folder may not import, and why. `@/` leads from one to another. */
const boundary = (folder, others, reason) => ({
  files: [`${folder}/**/*.{ts,tsx}`],
  rules: {
    'no-restricted-imports': [
      'error',
      {
        patterns: others.map((other) => ({
          group: [`@/${other}`, `@/${other}/**`, `**/../${other}/**`],
          message: reason,
        })),
      },
    ],
  },
});

const restrictPackages = (folder, names, reason) => ({
  files: [`${folder}/**/*.{ts,tsx}`],
  rules: {
    '@typescript-eslint/no-restricted-imports': [
      'error',
      { patterns: [{ group: names, message: reason }] },
    ],
  },
});

const NOW = [
  {
    selector: "CallExpression[callee.object.name='Date'][callee.property.name='now']",
    message: 'Take the time from server/clock.ts: a test can set it.',
  },
  {
    selector: "NewExpression[callee.name='Date'][arguments.length=0]",
    message: 'Take the time from server/clock.ts: a test can set it.',
  },
];

export default tseslint.config(
  {
    ignores: [
      'node_modules',
      'dist',
      '.data',
      '.expo',
      'coverage',
      'reports',
      '.stryker-tmp',
      'public',
      'expo-env.d.ts',
    ],
  },
  ...expo,
  // Calling a member of a default import is how most of these packages are meant.
  { rules: { 'import/no-named-as-default-member': 'off' } },
  {
    files: ['**/*.{ts,tsx}'],
    extends: [tseslint.configs.recommendedTypeChecked],
    languageOptions: {
      parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname },
    },
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-floating-promises': 'error',
      '@typescript-eslint/consistent-type-imports': ['error', { prefer: 'type-imports' }],
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_', caughtErrorsIgnorePattern: '^_' },
      ],
      // A handler of an element may be asynchronous: what it rejects with reaches the boundary.
      '@typescript-eslint/no-misused-promises': [
        'error',
        { checksVoidReturn: { attributes: false, properties: false } },
      ],
      // A figure or an id in a text is meant as it prints.
      '@typescript-eslint/restrict-template-expressions': [
        'error',
        { allowNumber: true, allowBoolean: true },
      ],
      // TypeScript knows what resolves; the plugin does not know `@/` and the platform suffixes.
      'import/no-unresolved': 'off',
      'import/namespace': 'off',
      'import/no-duplicates': 'off',
      eqeqeq: ['error', 'always'],
    },
  },
  boundary(
    'hazard',
    ['shared', 'server', 'components', 'app'],
    'hazard stands alone: it runs on the phone and on the server alike.',
  ),
  {
    files: ['hazard/**/*.ts'],
    rules: {
      '@typescript-eslint/no-restricted-imports': [
        'error',
        {
          patterns: [
            {
              regex: '^(?!\\.{1,2}/|@/hazard/|date-fns$)',
              message: 'hazard imports only itself and date-fns: no framework, no I/O.',
            },
          ],
        },
      ],
    },
  },
  {
    files: ['hazard/**/*.ts'],
    rules: {
      'no-restricted-globals': [
        'error',
        { name: 'process', message: 'hazard knows no process.' },
        { name: 'fetch', message: 'hazard does no I/O.' },
        { name: 'window', message: 'hazard knows no screen.' },
      ],
      'no-restricted-properties': [
        'error',
        { object: 'Date', property: 'now', message: 'hazard has no clock: pass `on`.' },
        { object: 'Math', property: 'random', message: 'The same input gives the same answer.' },
      ],
      'no-restricted-syntax': [
        'error',
        { selector: NOW[1].selector, message: 'hazard has no clock: pass `on`.' },
      ],
    },
  },
  boundary(
    'shared',
    ['server', 'components', 'app'],
    'shared is the contract of both sides and may know neither.',
  ),
  boundary(
    'server',
    ['components', 'app'],
    'The server shows no screens; what both sides need lies in shared.',
  ),
  restrictPackages(
    'server',
    ['react', 'react-*', 'expo', 'expo-*', '@expo/**'],
    'The server shows no screens.',
  ),
  boundary(
    'components',
    ['server', 'app'],
    'A screen speaks to the server over HTTP, and a route imports screens, not the other way.',
  ),
  restrictPackages(
    'components',
    ['express', 'sequelize', 'pg', 'pg-boss', 'node:*'],
    'This runs in a browser.',
  ),
  boundary('app', ['server'], 'A route speaks to the server over HTTP.'),
  {
    files: ['server/**/*.ts'],
    ignores: ['server/clock.ts', 'server/commands/**'],
    rules: { 'no-restricted-syntax': ['error', ...NOW] },
  },
  {
    // These rules are about what Expo bakes into the bundle; here the environment is read as it runs.
    files: ['server/**', 'tests/**', '*.{ts,mjs,cjs}'],
    rules: { 'expo/no-env-var-destructuring': 'off', 'expo/no-dynamic-env-var': 'off' },
  },
  {
    files: ['**/*.{mjs,cjs}'],
    languageOptions: {
      globals: Object.fromEntries(
        ['process', 'console', 'Buffer', 'module', 'require', '__dirname'].map((name) => [
          name,
          'readonly',
        ]),
      ),
    },
  },
  {
    // supertest answers `any`; what a test says of it is its own check.
    files: ['tests/**/*.{ts,tsx}'],
    rules: {
      '@typescript-eslint/no-unsafe-assignment': 'off',
      '@typescript-eslint/no-unsafe-member-access': 'off',
      '@typescript-eslint/no-unsafe-argument': 'off',
      '@typescript-eslint/no-unsafe-call': 'off',
      '@typescript-eslint/no-unsafe-return': 'off',
    },
  },
  {
    files: ['tests/components/**/*.{ts,tsx}', 'components/**/*.tsx'],
    rules: { '@typescript-eslint/unbound-method': 'off' },
  },
);
