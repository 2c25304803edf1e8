/** Which way imports may run. `tools/test/arrows.mjs` runs it and checks that it bites. */
const lib = (name) => `^libs/${name}/`;
const only = (name, from, allowed) => ({
  name,
  severity: 'error',
  from: { path: lib(from), pathNot: '\\.test\\.ts$' },
  to: { path: '^libs/', pathNot: [lib(from), ...allowed.map(lib)] },
});

module.exports = {
  forbidden: [
    {
      name: 'no-cycles',
      severity: 'error',
      from: {},
      to: { circular: true, viaOnly: { dependencyTypesNot: ['type-only'] } },
    },
    { name: 'lib-imports-app', severity: 'error', from: { path: '^libs/' }, to: { path: '^(apps|tools)/' } },
    {
      name: 'app-imports-app',
      severity: 'error',
      from: { path: '^apps/([^/]+)/' },
      to: { path: '^apps/', pathNot: '^apps/$1/' },
    },
    {
      name: 'delivery-and-field-log',
      severity: 'error',
      from: { path: '^libs/(delivery|field-log)/' },
      to: { path: '^libs/(delivery|field-log)/', pathNot: '^libs/$1/' },
    },
    only('units-alone', 'units', []),
    only('pneumatics-on-units', 'pneumatics', ['units']),
    only('trips-on-units', 'trips', ['units']),
    only('rules-below', 'rules', ['units', 'pneumatics', 'field-log']),
    only('contracts-on-field-log', 'contracts', ['field-log']),
    {
      name: 'lib-without-frameworks',
      severity: 'error',
      from: { path: '^libs/', pathNot: '\\.test\\.ts$' },
      to: { path: 'node_modules/(react|react-dom|@nestjs|typeorm|dexie|@mui|express|pg)/' },
    },
    {
      name: 'lib-without-node',
      severity: 'error',
      from: { path: '^libs/', pathNot: '(\\.test\\.ts|/testing/.*|vitest\\.config\\.mts)$' },
      to: { dependencyTypes: ['core'] },
    },
    {
      name: 'lib-front-door',
      severity: 'error',
      from: { path: '^apps/' },
      to: { path: '^libs/[^/]+/src/', pathNot: '^libs/[^/]+/src/(index|testing/.*)\\.ts$' },
    },
    {
      name: 'feature-imports-feature',
      severity: 'error',
      from: { path: '^apps/web/src/features/([^/]+)/' },
      to: { path: '^apps/web/src/features/', pathNot: '^apps/web/src/features/$1/' },
    },
    {
      name: 'feature-below-routes',
      severity: 'error',
      from: { path: '^apps/web/src/(features|components|phone)/' },
      to: { path: '^apps/web/src/routes/' },
    },
    {
      name: 'components-alone',
      severity: 'error',
      from: { path: '^apps/web/src/components/' },
      to: { path: '^apps/web/src/(features|phone)/' },
    },
    {
      name: 'phone-imports-libs-only',
      severity: 'error',
      from: { path: '^apps/web/src/phone/' },
      to: { path: '^apps/web/src/', pathNot: '^apps/web/src/phone/' },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '(^|/)(dist|coverage)/' },
    tsConfig: { fileName: 'tsconfig.tests.json' },
    tsPreCompilationDeps: true,
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['source', 'import', 'require', 'node', 'default'],
    },
  },
};
