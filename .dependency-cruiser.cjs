/** Which folder may import which: one way, named in every message. */
module.exports = {
  forbidden: [
    {
      name: 'no-circular',
      comment: 'Two files that need each other are one thing or three: move what both need into its own file.',
      severity: 'error',
      from: {},
      to: { circular: true, dependencyTypesNot: ['type-only'] },
    },
    {
      name: 'tables-import-nobody',
      comment: 'reference-tables holds numbers: it knows no other workspace.',
      severity: 'error',
      from: { path: '^reference-tables/' },
      to: { path: '^(rules|api|ui)/' },
    },
    {
      name: 'rules-are-pure',
      comment: 'rules knows no framework, clock, network or database: pass the fact in.',
      severity: 'error',
      from: { path: '^rules/src/', pathNot: '\\.spec\\.ts$' },
      to: {
        path: '^(api|ui)/|node_modules/(@nestjs|sequelize|react|mariadb)',
      },
    },
    {
      name: 'rules-need-no-node',
      comment: 'rules runs in the browser too: no Node built-ins.',
      severity: 'error',
      from: { path: '^rules/src/', pathNot: '\\.spec\\.ts$' },
      to: { dependencyTypes: ['core'] },
    },
    {
      name: 'api-and-ui-apart',
      comment: 'api and ui meet in rules: put the shared schema there.',
      severity: 'error',
      from: { path: '^api/' },
      to: { path: '^ui/' },
    },
    {
      name: 'ui-and-api-apart',
      comment: 'api and ui meet in rules: put the shared schema there.',
      severity: 'error',
      from: { path: '^ui/' },
      to: { path: '^api/' },
    },
    {
      name: 'ui-without-the-feedstuff-table',
      comment: 'The feedstuff table is large: ask the API for what the page needs.',
      severity: 'error',
      from: { path: '^ui/src' },
      to: { path: '^reference-tables/(src/feedstuffs|feedstuffs/)' },
    },
    {
      name: 'ui-lib-is-the-bottom',
      comment: 'lib knows no component, feature or page.',
      severity: 'error',
      from: { path: '^ui/src/lib/' },
      to: { path: '^ui/src/(components|features|pages|app)/' },
    },
    {
      name: 'ui-components-are-domain-free',
      comment: 'A component knows no feature or page: pass it in.',
      severity: 'error',
      from: { path: '^ui/src/components/' },
      to: { path: '^ui/src/(features|pages|app)/' },
    },
    {
      name: 'ui-features-apart',
      comment: 'A feature never imports another feature: compose the two in a page.',
      severity: 'error',
      from: { path: '^ui/src/features/([^/]+)/' },
      to: { path: '^ui/src/(features/(?!$1/)|pages/)' },
    },
    {
      name: 'kebab-case',
      comment: 'File names are kebab-case.',
      severity: 'error',
      from: {},
      to: { path: '^(reference-tables|rules|api|ui)/(src|test|e2e|bin)/.*[A-Z][^/]*\\.tsx?$' },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '/dist/' },
    tsPreCompilationDeps: true,
    enhancedResolveOptions: {
      conditionNames: ['source', 'import', 'require', 'node', 'default'],
      exportsFields: ['exports'],
    },
  },
};
