import js from '@eslint/js';
import query from '@tanstack/eslint-plugin-query';
import boundaries from 'eslint-plugin-boundaries';
import { createNodeResolver, importX } from 'eslint-plugin-import-x';
import jsxA11y from 'eslint-plugin-jsx-a11y';
import reactHooks from 'eslint-plugin-react-hooks';
import typescript from 'typescript-eslint';

const extensions = ['.ts', '.tsx', '.mjs', '.js'];

/** Where each kind of file lives. The first pattern that fits a file decides what it is. */
const rooms = [
  ['domain', 'packages/domain/**'],
  ['contract', 'packages/contract/**'],
  ['api-test', ['apps/api/**/*.test.ts', 'apps/api/src/testing/**', 'apps/api/*.config.ts']],
  ['api-launch', 'apps/api/src/{server,verify,backup,restore}.ts'],
  ['api-app', 'apps/api/src/app.ts'],
  ['api-routes', 'apps/api/src/modules/*/*.routes.ts', ['module']],
  ['api-repository', 'apps/api/src/modules/*/*.repository.ts', ['module']],
  ['api-entity', 'apps/api/src/**/*.entity.ts'],
  ['api-module', 'apps/api/src/modules/*/**', ['module']],
  ['api-flow', 'apps/api/src/flows/**'],
  ['api-db', 'apps/api/src/db/**'],
  ['api-http', 'apps/api/src/http/**'],
  ['api-outside', 'apps/api/src/outside/**'],
  ['api-papers', 'apps/api/src/papers/**'],
  ['api-workers', 'apps/api/src/workers/**'],
  ['api-background', 'apps/api/src/background/**'],
  ['api-migrations', 'apps/api/src/migrations/**'],
  ['api-seeders', 'apps/api/src/seeders/**'],
  ['api-verify', 'apps/api/src/verify/**'],
  ['api-root', 'apps/api/src/*.ts'],
  ['web-test', ['apps/web/**/*.test.{ts,tsx}', 'apps/web/*.config.ts']],
  ['web-app', ['apps/web/src/main.tsx', 'apps/web/src/app/**']],
  ['web-feature', 'apps/web/src/features/*/**', ['feature']],
  ['web-components', 'apps/web/src/components/**'],
  ['web-lib', ['apps/web/src/lib/**', 'apps/web/src/*.{ts,css}']],
  ['stand-ins', 'apps/stand-ins/**'],
  ['tests', 'tests/**'],
  ['scripts', 'scripts/**'],
];

const sameModule = { module: '${from.module}' };
const sameFeature = { feature: '${from.feature}' };
const apiInside = ['api-root', 'api-db', 'api-http', 'api-entity', 'api-module'];
/** What leaves the process, draws papers or works hard is handed in; its types may be named anywhere. */
const handedIn = ['api-outside', 'api-papers', 'api-workers'];

/** Who may import whom: DEVELOPERS.md says it in words. What is not named here is refused. */
const directions = [
  { from: 'domain', allow: ['domain'] },
  { from: 'contract', allow: ['contract'] },

  { from: 'api-test', allow: ['api-*'] },
  { from: 'api-launch', allow: ['api-*'] },
  { from: 'api-app', allow: ['api-root', 'api-routes', 'api-http', 'api-db'] },
  {
    from: 'api-routes',
    allow: [...apiInside, 'api-flow', ['api-repository', sameModule], ['api-routes', sameModule]],
  },
  { from: 'api-flow', allow: [...apiInside, 'api-flow'] },
  { from: 'api-module', allow: [...apiInside, ['api-repository', sameModule]] },
  { from: 'api-repository', allow: apiInside },
  { from: 'api-entity', allow: ['api-entity', 'api-db', 'api-module'] },
  {
    from: ['api-routes', 'api-flow', 'api-module', 'api-http'],
    allow: handedIn,
    importKind: 'type',
  },
  { from: 'api-root', allow: ['api-root', 'api-db', 'api-entity', 'api-migrations', ...handedIn] },
  { from: 'api-db', allow: ['api-db', 'api-entity', 'api-root', 'api-migrations'] },
  { from: 'api-http', allow: ['api-http', 'api-root', 'api-db', 'api-entity', 'api-module'] },
  { from: 'api-outside', allow: ['api-outside'] },
  { from: 'api-outside', allow: ['api-root'], importKind: 'type' },
  { from: 'api-papers', allow: ['api-papers'] },
  {
    from: 'api-workers',
    allow: ['api-workers', 'api-papers', 'api-root', 'api-db', 'api-entity', 'api-module'],
  },
  { from: 'api-background', allow: [...apiInside, 'api-background', 'api-flow', 'api-outside'] },
  { from: 'api-verify', allow: ['api-verify', 'api-root', 'api-db', 'api-entity', 'api-module'] },
  { from: 'api-migrations', allow: ['api-migrations', 'api-db'] },
  {
    from: 'api-seeders',
    allow: [...apiInside, 'api-seeders', 'api-flow', 'api-outside', 'api-background'],
  },

  { from: 'web-test', allow: ['web-*'] },
  { from: 'web-app', allow: ['web-app', 'web-feature', 'web-components', 'web-lib'] },
  { from: 'web-feature', allow: [['web-feature', sameFeature], 'web-components', 'web-lib'] },
  { from: 'web-components', allow: ['web-components', 'web-lib'] },
  { from: 'web-lib', allow: ['web-lib'] },

  { from: 'stand-ins', allow: ['stand-ins'] },
  { from: 'tests', allow: ['tests'] },
  { from: 'scripts', allow: ['scripts'] },
];

/** Packages that a part of the workspace must do without. */
function refuse(files, group, message, ignores = []) {
  return {
    files,
    ignores,
    rules: { 'no-restricted-imports': ['error', { patterns: [{ group, message }] }] },
  };
}

const tests = ['**/*.test.{ts,tsx}'];
const packageDirections = [
  refuse(
    ['packages/domain/**'],
    ['node:*', 'zod', '@hidewright/*', 'react*', 'express*', '@mikro-orm/*'],
    'The domain is pure computation: hand in what it needs.',
    tests,
  ),
  refuse(
    ['packages/contract/**'],
    ['node:*', '@hidewright/*', '!@hidewright/domain', 'react*', 'express*', '@mikro-orm/*'],
    'The contract knows zod and the domain.',
    tests,
  ),
  refuse(
    ['apps/api/**'],
    ['@hidewright/web*', '@hidewright/stand-ins*', '@hidewright/*/*', 'react*'],
    'The API knows the contract and the domain, by their package names.',
  ),
  refuse(
    ['apps/web/src/**'],
    ['node:*', '@hidewright/api*', '@hidewright/stand-ins*', '@hidewright/*/*', '@mikro-orm/*'],
    'The pages know the contract and the domain, and reach the API over HTTP.',
    tests,
  ),
  refuse(
    ['apps/stand-ins/**'],
    ['@hidewright/*'],
    'A stand-in speaks a real protocol and knows nothing of Hidewright.',
  ),
  refuse(['tests/**'], ['@hidewright/*/*'], 'Tests use what a package exports.'),
  {
    files: ['scripts/**'],
    rules: {
      'no-restricted-imports': [
        'error',
        {
          patterns: [
            { regex: '^(?!node:|\\.)', message: 'Scripts must run before anything is installed.' },
          ],
        },
      ],
    },
  },
];

const element = ([type, pattern, capture]) => ({
  type,
  pattern,
  mode: 'full',
  ...(capture && { capture }),
});

/** The import directions by themselves, so that a test can lint wrong imports planted below `root`. */
export function importDirections(root) {
  return [
    {
      files: ['{apps,packages,tests,scripts}/**/*.{ts,tsx,mjs}'],
      languageOptions: { parser: typescript.parser },
      plugins: { boundaries, 'import-x': importX },
      settings: {
        'boundaries/root-path': root,
        'boundaries/elements': rooms.map(element),
        'boundaries/include': ['{apps,packages,tests,scripts}/**/*.{ts,tsx,mjs}'],
        'import/resolver': { node: { extensions } },
        'import-x/extensions': extensions,
        'import-x/resolver-next': [createNodeResolver({ extensions })],
      },
      rules: {
        'boundaries/element-types': ['error', { default: 'disallow', rules: directions }],
        'boundaries/no-unknown-files': 'error',
        'import-x/no-cycle': ['error', { ignoreExternal: true }],
      },
    },
    ...packageDirections,
  ];
}

const pureDomain = {
  files: ['packages/domain/**'],
  ignores: tests,
  rules: {
    'no-restricted-globals': ['error', 'process', 'performance', 'crypto', 'window', 'fetch'],
    'no-restricted-properties': [
      'error',
      { object: 'Math', property: 'random', message: 'Chance is handed in.' },
      { object: 'Date', property: 'now', message: 'The time is handed in.' },
    ],
    'no-restricted-syntax': [
      'error',
      {
        selector: "NewExpression[callee.name='Date'][arguments.length=0]",
        message: 'The time is handed in.',
      },
    ],
  },
};

const everywhere = {
  plugins: { 'import-x': importX },
  rules: {
    'import-x/no-default-export': 'error',
    eqeqeq: 'error',
    'no-console': 'error',
    'no-warning-comments': ['error', { terms: ['todo', 'fixme', 'xxx'], location: 'anywhere' }],
    'max-lines': ['warn', { max: 250, skipBlankLines: true, skipComments: true }],
    'no-empty-pattern': ['error', { allowObjectPatternsAsParameters: true }],
    'object-shorthand': 'error',
    'prefer-const': 'error',
  },
};

const typed = {
  files: ['**/*.{ts,tsx}'],
  extends: [typescript.configs.strict],
  rules: {
    '@typescript-eslint/consistent-type-imports': 'error',
    '@typescript-eslint/no-import-type-side-effects': 'error',
    '@typescript-eslint/no-invalid-void-type': 'off',
    '@typescript-eslint/no-namespace': ['error', { allowDeclarations: true }],
    '@typescript-eslint/no-unused-vars': [
      'error',
      { argsIgnorePattern: '^_', varsIgnorePattern: '^_', ignoreRestSiblings: true },
    ],
  },
};

/** Rules that need types cost as much as a type check: only where promises are made and awaited. */
const typedRules = {
  files: ['apps/{api,stand-ins}/**/*.ts', 'apps/web/src/**/*.ts', 'tests/**/*.ts'],
  ignores: ['**/*.config.ts'],
  languageOptions: {
    parserOptions: { projectService: true, tsconfigRootDir: import.meta.dirname },
  },
  rules: {
    '@typescript-eslint/await-thenable': 'error',
    '@typescript-eslint/no-floating-promises': 'error',
    '@typescript-eslint/no-misused-promises': [
      'error',
      { checksVoidReturn: { attributes: false } },
    ],
    // React Router redirects by throwing a Response.
    '@typescript-eslint/only-throw-error': [
      'error',
      { allow: [{ from: 'lib', name: 'Response' }] },
    ],
    '@typescript-eslint/switch-exhaustiveness-check': [
      'error',
      { considerDefaultExhaustiveForUnions: true },
    ],
  },
};

const web = {
  files: ['apps/web/src/**/*.{ts,tsx}'],
  plugins: { 'react-hooks': reactHooks, '@tanstack/query': query },
  rules: {
    ...reactHooks.configs.recommended.rules,
    // React Hook Form hands its refs out during render, and a kept draft is restored after it.
    'react-hooks/refs': 'off',
    'react-hooks/set-state-in-effect': 'off',
    ...query.configs['flat/recommended'][0].rules,
  },
};

const nodeGlobals = Object.fromEntries(
  [
    'process',
    'console',
    'Buffer',
    'URL',
    'performance',
    'setTimeout',
    'clearTimeout',
    'setInterval',
    'clearInterval',
    'fetch',
  ].map((name) => [name, 'readonly']),
);

export default typescript.config(
  {
    ignores: [
      '**/dist/',
      '**/node_modules/',
      'data*/',
      'screens/',
      'coverage/',
      '.cache/',
      'test-results/',
    ],
  },
  js.configs.recommended,
  typed,
  everywhere,
  typedRules,
  pureDomain,
  web,
  { files: ['apps/web/src/**/*.tsx'], ...jsxA11y.flatConfigs.recommended },
  ...importDirections(import.meta.dirname),
  {
    files: ['scripts/**/*.mjs', 'tests/**/*.mjs', 'apps/api/src/workers/*.mjs', '*.js'],
    languageOptions: { globals: nodeGlobals },
  },
  {
    files: ['**/*.config.{js,ts}'],
    rules: { 'import-x/no-default-export': 'off', 'max-lines': 'off' },
  },
  {
    files: [
      'scripts/**',
      'tests/{bench,screens,drills}/**',
      'apps/stand-ins/src/**',
      'apps/api/src/{server,verify,backup,restore}.ts',
    ],
    rules: { 'no-console': 'off' },
  },
  {
    files: [...tests, 'tests/**'],
    rules: { '@typescript-eslint/no-non-null-assertion': 'off', 'max-lines': 'off' },
  },
  { files: ['apps/api/src/{migrations,seeders/demo/scenario}/**'], rules: { 'max-lines': 'off' } },
);
