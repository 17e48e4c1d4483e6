import js from '@eslint/js';
import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

/** Forbids imports between layers; each entry says in words what the rule protects. */
const layer = (files, ...bans) => ({
  files,
  rules: {
    'no-restricted-imports': [
      'error',
      { patterns: bans.map(([group, message]) => ({ group, message, caseSensitive: true })) },
    ],
  },
});

const noTests = [['#tests/*', '**/tests/**'], 'Nothing imports tests.'];
const noServer = [['#server/*', '**/server/**'], 'Browser code never imports the server.'];
const noBrowser = [
  ['#src/*', '#kiosk/*', 'react', 'react-dom', 'react-router-dom'],
  'The server never imports browser code.',
];
const pure = [
  ['#server/*', '#src/*', '#kiosk/*', 'react*', 'express', 'sequelize', 'pg', 'node:*'],
  'shared is pure: no React, Express, Sequelize, Node or browser globals.',
];

const noTerminal = [['#kiosk/*'], 'The desk and the terminal never meet.'];
const noDesk = [['#src/desk/*'], 'The desk and the terminal never meet.'];
const ownFeature = [
  ['../*', '#src/desk/features/*', '#kiosk/features/*'],
  'Features never import one another: what two of them need lives in parts or lib.',
];

export default tseslint.config(
  { ignores: ['dist/', 'node_modules/', 'data/', 'screens/'] },
  js.configs.recommended,
  {
    files: ['**/*.{ts,tsx}'],
    extends: [tseslint.configs.recommendedTypeChecked],
    languageOptions: { parserOptions: { projectService: true } },
    rules: {
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-import-type-side-effects': 'error',
      '@typescript-eslint/no-misused-promises': [
        'error',
        { checksVoidReturn: { attributes: false, arguments: false } },
      ],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', ignoreRestSiblings: true }],
      eqeqeq: 'error',
      'no-console': 'error',
      'max-lines': ['error', { max: 300, skipBlankLines: true, skipComments: true }],
    },
  },
  {
    files: ['src/**/*.{ts,tsx}', 'kiosk/**/*.{ts,tsx}'],
    extends: [reactHooks.configs.flat['recommended-latest']],
  },
  {
    files: ['server/cli/**', 'tests/run.mjs', 'tests/screens/**', 'tests/bench/**'],
    rules: { 'no-console': 'off' },
  },
  {
    files: ['**/*.mjs'],
    languageOptions: {
      globals: { process: 'readonly', console: 'readonly', URL: 'readonly', setTimeout: 'readonly' },
    },
  },
  layer(['shared/lib/**'], pure, noTests, [
    ['#shared/{metallurgy,domain,contracts}/*'],
    'lib is the lowest layer.',
  ]),
  layer(['shared/metallurgy/**'], pure, noTests, [
    ['#shared/{domain,contracts}/*'],
    'metallurgy knows nothing above it.',
  ]),
  layer(['shared/domain/**'], pure, noTests, [['#shared/contracts/*'], 'domain never sees transport types.']),
  layer(['shared/contracts/**'], pure, noTests),
  layer(['server/{commands,queries,models,services,policies}/**'], noBrowser, noTests, [
    ['express', '#server/presenters/*', '#server/routes/*'],
    'Commands, queries and models know no HTTP.',
  ]),
  layer(['server/{routes,middlewares,presenters,cli}/**', 'server/*.ts'], noBrowser, noTests),
  layer(['src/{api,ui,lib}/**'], noServer, noTests, [
    ['#kiosk/*', '#src/desk/*'],
    'Shared browser code knows neither application.',
  ]),
  layer(['src/desk/**'], noServer, noTests, noTerminal),
  layer(['src/desk/features/**'], noServer, noTests, noTerminal, ownFeature),
  layer(['kiosk/**'], noServer, noTests, noDesk),
  layer(['kiosk/features/**'], noServer, noTests, noDesk, ownFeature),
);
