/** Where code may reach. Each rule says why. */
module.exports = {
  forbidden: [
    {
      name: 'answers-stay-on-the-server',
      severity: 'error',
      comment: 'The site is public: it must never bundle what knows the answers.',
      from: { path: '^site/' },
      to: { path: '^(assessments|server)/' },
    },
    {
      name: 'site-only-verifies-certificates',
      severity: 'error',
      comment: 'The browser checks certificates; drawing and signing stay on the server.',
      from: { path: '^site/src/' },
      to: { path: '^certificates/', pathNot: '^certificates/(src|dist)/verify' },
    },
    {
      name: 'libraries-stand-alone',
      severity: 'error',
      comment: 'The libraries are pure: they know neither the server nor the site nor each other.',
      from: { path: '^(assessments|certificates)/src/' },
      to: { path: '^(server|site|lessons)/|node_modules/(@nestjs|react|sequelize)' },
    },
    {
      name: 'assessments-apart-from-certificates',
      severity: 'error',
      comment: 'Marking does not depend on certificates.',
      from: { path: '^assessments/' },
      to: { path: '^certificates/' },
    },
    {
      name: 'libraries-touch-no-files',
      severity: 'error',
      comment: 'Libraries are given their input: no file system, network or processes.',
      from: { path: '^(assessments|certificates)/src/', pathNot: '\\.spec\\.ts$' },
      to: { dependencyTypes: ['core'], path: '^(node:)?(fs|net|http|https|child_process|os)' },
    },
    {
      name: 'server-leaves-the-site-alone',
      severity: 'error',
      comment: 'The server serves the built site as files and imports none of it.',
      from: { path: '^server/' },
      to: { path: '^site/' },
    },
    {
      name: 'models-behind-their-repository',
      severity: 'error',
      comment: 'Only a repository and its module touch the models.',
      from: {
        path: '^server/src/',
        pathNot: '(repository|module|model|models\\.spec|spec)\\.ts$|^server/src/database/',
      },
      to: { path: '^server/src/.+/models/' },
    },
    {
      name: 'features-through-their-service',
      severity: 'error',
      comment:
        'Another feature is reached through its exported service, module, errors or pure types.',
      from: { path: '^server/src/([^/]+)/', pathNot: '\\.spec\\.ts$' },
      to: {
        path: '^server/src/[^/]+/.+\\.(repository|controller|schemas)\\.ts$|^server/src/[^/]+/models/',
        pathNot: '^server/src/$1/',
      },
    },
    {
      name: 'features-do-not-reach-across',
      severity: 'error',
      comment: 'Two site features on one page are composed by the route.',
      from: { path: '^site/src/features/([^/]+)/' },
      to: { path: '^site/src/features/', pathNot: '^site/src/features/$1/' },
    },
    {
      name: 'ui-knows-no-product',
      severity: 'error',
      comment: 'Shared parts know nothing of features or routes.',
      from: { path: '^site/src/(ui|api)/' },
      to: { path: '^site/src/(features|routes)/' },
    },
    {
      name: 'routes-are-the-top',
      severity: 'error',
      comment: 'Only the router imports routes.',
      from: { path: '^site/src/', pathNot: '^site/src/(router|main|testing/|routes/)' },
      to: { path: '^site/src/routes/' },
    },
    {
      name: 'no-cycles',
      severity: 'error',
      comment: 'A cycle means two files are one idea.',
      from: { pathNot: '/models/' },
      to: { circular: true, viaOnly: { pathNot: '/models/' } },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '(^|/)(dist|dist-types|node_modules/\\.)' },
    tsConfig: { fileName: 'tsconfig.base.json' },
    tsPreCompilationDeps: true,
    enhancedResolveOptions: {
      conditionNames: ['@ferrule/source', 'import', 'node', 'types', 'default'],
      exportsFields: ['exports'],
    },
  },
};
