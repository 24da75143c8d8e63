/** The house's arrows: app → components → shared, server → shared, nothing else, and no cycles. */
module.exports = {
  forbidden: [
    {
      name: 'no-cycles',
      severity: 'error',
      from: { pathNot: '^server/db/entities' },
      to: { circular: true },
    },
    {
      name: 'shared-is-pure',
      severity: 'error',
      from: { path: '^shared/' },
      to: { path: '^(app|components|server)/' },
    },
    {
      name: 'shared-has-no-io',
      severity: 'error',
      from: { path: '^shared/' },
      to: { dependencyTypes: ['core'] },
    },
    {
      name: 'components-not-server',
      severity: 'error',
      from: { path: '^components/' },
      to: { path: '^(server|app)/' },
    },
    {
      name: 'server-not-components',
      severity: 'error',
      from: { path: '^server/' },
      to: { path: '^(app|components)/' },
    },
    {
      name: 'app-not-server',
      severity: 'error',
      from: { path: '^app/' },
      to: { path: '^server/' },
    },
    {
      name: 'no-feature-into-feature-screens',
      severity: 'error',
      from: { path: '^components/(plans|bench|drafting|shop-card|talk|cases|account)/' },
      to: {
        path: '^components/(plans|bench|drafting|shop-card|talk|cases|account)/.*-screen',
        pathNot: '^components/$1/',
      },
    },
    {
      name: 'server-feature-insides',
      severity: 'error',
      from: { path: '^server/features/([^/]+)/' },
      to: {
        path: '^server/features/([^/]+)/.*routes',
        pathNot: '^server/features/$1/',
      },
    },
  ],
  options: {
    tsPreCompilationDeps: true,
    doNotFollow: { path: 'node_modules' },
    tsConfig: { fileName: 'tsconfig.json' },
  },
};
