/** Who may import whom. Run by `npm run lint`. */
module.exports = {
  forbidden: [
    { name: 'no-cycles', severity: 'error', from: {}, to: { circular: true } },
    {
      name: 'engine-imports-itself-only',
      severity: 'error',
      from: { path: '^shared/engineering/', pathNot: '\\.test\\.ts$' },
      to: { pathNot: '^shared/engineering/' },
    },
    {
      name: 'shared-is-neutral',
      severity: 'error',
      from: { path: '^shared/', pathNot: '\\.test\\.ts$' },
      to: { path: '^(client|server|scripts|e2e)/' },
    },
    {
      name: 'shared-needs-no-platform',
      severity: 'error',
      from: { path: '^shared/', pathNot: '\\.test\\.ts$' },
      to: { dependencyTypes: ['core'] },
    },
    {
      name: 'client-not-server',
      severity: 'error',
      from: { path: '^client/' },
      to: { path: '^(server|scripts|e2e)/' },
    },
    {
      name: 'server-not-client',
      severity: 'error',
      from: { path: '^server/' },
      to: { path: '^(client|scripts|e2e)/' },
    },
    {
      name: 'features-stay-apart',
      severity: 'error',
      from: { path: '^client/features/([^/]+)/' },
      to: { path: '^client/features/', pathNot: '^client/features/$1/' },
    },
    {
      name: 'mathjs-in-one-place',
      severity: 'error',
      from: { pathNot: '^shared/combination-text/' },
      to: { path: 'node_modules/mathjs' },
    },
    {
      name: 'orm-in-db-only',
      severity: 'error',
      from: { path: '^(server|client|shared)/', pathNot: '^server/db/' },
      to: { path: 'node_modules/typeorm' },
    },
    {
      name: 'entities-by-repositories-only',
      severity: 'error',
      from: { pathNot: '^server/db/' },
      to: { path: '^server/db/entities' },
    },
    {
      name: 'routes-by-services',
      severity: 'error',
      from: { path: '^server/routes/', pathNot: '\\.test\\.ts$' },
      to: { path: '^server/db/' },
    },
    {
      name: 'workbook-library-in-workbook',
      severity: 'error',
      from: { path: '^(server|client|shared)/', pathNot: '^server/workbook/|\\.test\\.ts$' },
      to: { path: 'node_modules/exceljs' },
    },
  ],
  options: {
    tsConfig: { fileName: 'tsconfig.json' },
    tsPreCompilationDeps: true,
    doNotFollow: { path: 'node_modules' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'node', 'default', 'types'],
      extensions: ['.ts', '.tsx', '.js', '.mjs'],
    },
  },
};
