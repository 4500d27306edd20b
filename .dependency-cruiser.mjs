/** Features of the API, from the ground up: each may use those on lower steps, none on its own step or above. */
const ladder = [
  ['organisations'],
  ['memberships'],
  ['rounds'],
  ['candidates'],
  ['documents'],
  ['quotes'],
  ['costing', 'scoring'],
  ['candidate-table', 'limits', 'overview'],
  ['frontier'],
  ['portfolios'],
  ['notifications'],
  ['selections'],
  ['orders'],
  ['exports'],
];

/** What every feature of the API may use; these hear of no feature. */
const foundation = ['common', 'config', 'tenancy', 'jobs', 'storage', 'mail', 'audit'];

const api = (folders) => `^graphql-api/src/(${folders.join('|')})/`;

const upTheLadder = ladder.flatMap((step, height) =>
  step.map((feature) => ({
    name: `ladder-${feature}`,
    comment: 'A feature uses earlier features only; a later one adds its field from its own folder.',
    severity: 'error',
    from: { path: api([feature]) },
    to: {
      path: api(
        ladder
          .slice(height)
          .flat()
          .filter((other) => other !== feature),
      ),
    },
  })),
);

export default {
  forbidden: [
    {
      name: 'no-cycles',
      severity: 'error',
      from: {},
      to: { circular: true, viaOnly: { dependencyTypesNot: ['type-only'] } },
    },
    {
      name: 'kernels-stand-alone',
      comment: 'A kernel uses other kernels and nothing else, not even node: modules.',
      severity: 'error',
      from: { path: '^graphql-api/kernels/[^/]+/src/' },
      to: { pathNot: '^graphql-api/kernels/[^/]+/(src|dist)/' },
    },
    {
      name: 'kernels-have-one-door',
      severity: 'error',
      from: { path: '^graphql-api/(src|kernels/([^/]+))/' },
      to: {
        path: '^graphql-api/kernels/[^/]+/(src|dist)/',
        pathNot: '/(src|dist)/index\\.|^graphql-api/kernels/$2/',
      },
    },
    ...upTheLadder,
    {
      name: 'foundation-below-features',
      comment: 'It knows the names of the roles, and nothing else of a feature.',
      severity: 'error',
      from: { path: api(foundation) },
      to: { path: api(ladder.flat()), pathNot: '/memberships/role\\.enum' },
    },
    {
      name: 'features-not-to-database',
      comment: 'The data source is behind TenantDatabase. Letters name the address of a page.',
      severity: 'error',
      from: { path: api(ladder.flat()), pathNot: '/notifications/page-links\\.' },
      to: { path: api(['database', 'config']) },
    },
    {
      name: 'features-of-the-web-stand-alone',
      comment: 'Routes compose features; a feature knows itself, ui and lib.',
      severity: 'error',
      from: { path: '^web/src/features/([^/]+)/' },
      to: { path: '^web/src/(features|routes)/', pathNot: '^web/src/features/$1/' },
    },
    {
      name: 'ui-and-lib-below-features',
      severity: 'error',
      from: { path: '^web/src/(ui|lib)/' },
      to: { path: '^web/src/(features|routes)/' },
    },
    {
      name: 'web-knows-the-api-by-its-schema',
      severity: 'error',
      from: { path: '^web/' },
      to: { path: '^(graphql-api|scripts|storage-fake)/' },
    },
    {
      name: 'api-knows-no-web',
      comment: 'A bench may measure a kernel beside what the scripts know of.',
      severity: 'error',
      from: { path: '^graphql-api/', pathNot: '^graphql-api/kernels/[^/]+/bench/' },
      to: { path: '^(web|scripts|storage-fake)/' },
    },
    {
      name: 'everything-imported-exists',
      severity: 'error',
      from: {},
      to: { couldNotResolve: true },
    },
  ],
  options: {
    doNotFollow: { path: ['node_modules', '/dist/'] },
    exclude: { path: ['\\.tsbuildinfo$'] },
    tsPreCompilationDeps: true,
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'types', 'node', 'default'],
      extensions: ['.ts', '.tsx', '.mjs', '.js', '.json'],
    },
  },
};
