import js from '@eslint/js';
import reactHooks from 'eslint-plugin-react-hooks';
import tseslint from 'typescript-eslint';

const nodeGlobals = Object.fromEntries(
  [
    'Buffer',
    'URL',
    'clearTimeout',
    'console',
    'fetch',
    'performance',
    'process',
    'setInterval',
    'setTimeout',
  ].map((name) => [name, 'readonly']),
);

const browserGlobals = { document: 'readonly', localStorage: 'readonly', matchMedia: 'readonly' };

/** The database keeps organisations apart only while every query goes through the one door, TenantDatabase. */
const oneDoor = {
  'no-restricted-imports': [
    'error',
    {
      paths: [
        { name: 'typeorm', importNames: ['DataSource'], message: 'Go through TenantDatabase.' },
        {
          name: '@nestjs/typeorm',
          importNames: ['InjectRepository', 'InjectDataSource', 'InjectEntityManager'],
          message: 'Go through TenantDatabase.',
        },
      ],
    },
  ],
  'no-restricted-syntax': [
    'error',
    {
      selector: 'CallExpression[callee.property.name="getRepository"]',
      message: 'Go through TenantDatabase.',
    },
    ...sessionSettings(),
  ],
};

export default tseslint.config(
  { ignores: ['**/dist/', '**/node_modules/', '.local/', '**/*.generated.ts', 'web/src/generated/'] },
  js.configs.recommended,
  {
    files: ['**/*.mjs'],
    languageOptions: { globals: nodeGlobals },
    rules: { 'no-empty': ['error', { allowEmptyCatch: false }] },
  },
  {
    files: ['**/*.{ts,tsx}'],
    extends: [tseslint.configs.recommendedTypeChecked],
    languageOptions: {
      parserOptions: {
        project: [
          'graphql-api/tsconfig.test.json',
          'graphql-api/kernels/*/tsconfig.json',
          'web/tsconfig.json',
        ],
        tsconfigRootDir: import.meta.dirname,
      },
    },
    rules: {
      '@typescript-eslint/consistent-type-imports': ['error', { disallowTypeAnnotations: false }],
      '@typescript-eslint/no-misused-promises': ['error', { checksVoidReturn: { attributes: false } }],
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
    },
  },
  {
    files: ['web/**/*.{ts,tsx}'],
    plugins: { 'react-hooks': reactHooks },
    rules: reactHooks.configs.recommended.rules,
  },
  {
    files: ['graphql-api/test/**/*.ts', '**/*.spec.ts', '**/*.test.{ts,tsx}', 'web/e2e/**/*.ts'],
    rules: answersAreUntyped(),
  },
  { files: ['web/public/*.js'], languageOptions: { globals: browserGlobals } },
  { files: ['graphql-api/src/**/*.ts'], rules: oneDoor },
  {
    files: [
      'graphql-api/src/{database,tenancy}/**/*.ts',
      'graphql-api/src/migrate.ts',
      'graphql-api/src/auth/sessions.service.ts', // before anyone is signed in: the definer functions of identity
      'graphql-api/src/frontier/run-sweep.service.ts', // looks for lost runs of every organisation, by a definer function
      'graphql-api/src/web-host/health.controller.ts', // asks whether the database answers, for nobody
    ],
    rules: { 'no-restricted-imports': 'off', 'no-restricted-syntax': ['error', ...sessionSettings()] },
  },
);

/** What a test reads from an answer over HTTP has no type; the expectation that follows is the check. */
function answersAreUntyped() {
  const kinds = ['argument', 'assignment', 'call', 'member-access', 'return'];
  return Object.fromEntries(kinds.map((kind) => [`@typescript-eslint/no-unsafe-${kind}`, 'off']));
}

/** A setting that outlives its transaction would show the next request on the connection to another organisation. */
function sessionSettings() {
  const message = 'Settings end with their transaction: set_config(name, value, true).';
  const sql = [
    String.raw`^\s*set\s+(?!local\b|constraints\b|transaction\b)`,
    String.raw`set_config\([^)]*,\s*false\s*\)`,
  ];
  return sql.flatMap((pattern) => [
    { selector: `CallExpression[callee.property.name="query"] Literal[value=/${pattern}/i]`, message },
    {
      selector: `CallExpression[callee.property.name="query"] TemplateElement[value.raw=/${pattern}/i]`,
      message,
    },
  ]);
}
