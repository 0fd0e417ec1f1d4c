/** Which folder may use which. Everything not allowed here is an error; type imports count. */
const test = '\\.test\\.tsx?$';

/** The workspaces that each package or app may import from, besides itself. */
const mayUse = {
  'packages/units': [],
  'packages/contracts': ['packages/units'],
  'packages/trace-reading': ['packages/units'],
  'packages/attenuation': ['packages/units', 'packages/trace-reading'],
  'packages/lots': ['packages/units', 'packages/trace-reading', 'packages/attenuation'],
  'packages/rehearsal': ['packages/units', 'packages/trace-reading', 'packages/attenuation', 'packages/lots'],
  'packages/database': ['packages/contracts', 'packages/units'],
  'packages/object-store': ['packages/contracts', 'packages/units'],
  'packages/job-queue': ['packages/contracts', 'packages/units'],
  'packages/mailer': ['packages/contracts', 'packages/units'],
  'packages/report-document': ['packages/contracts', 'packages/units'],
  'apps/api': ['packages/(contracts|database|object-store|job-queue|mailer|units|rehearsal)'],
  'apps/worker': ['packages/[^/]+'],
  'apps/web': ['packages/(contracts|units|rehearsal|trace-reading)'],
  'apps/leeside': ['packages/(contracts|units|trace-reading|attenuation|rehearsal)'],
};

const workspaceRules = Object.entries(mayUse).map(([workspace, allowed]) => ({
  name: `only-what-${workspace.replace('/', '-')}-may-use`,
  comment: `${workspace} may use: ${allowed.join(', ') || 'nothing of the house'}.`,
  severity: 'error',
  from: { path: `^${workspace}/` },
  to: { path: '^(packages|apps)/', pathNot: [`^${workspace}/`, ...allowed.map((other) => `^${other}/`)] },
}));

const pure = '^packages/(units|contracts|trace-reading|attenuation|lots|rehearsal)/';

const houseRules = [
  {
    name: 'no-cycles',
    comment: 'Two files that need each other are one idea, or hide a third. Type imports count.',
    severity: 'error',
    from: {},
    to: { circular: true },
  },
  {
    name: 'nothing-unresolvable',
    severity: 'error',
    from: {},
    to: { couldNotResolve: true },
  },
  {
    name: 'packages-never-import-apps',
    severity: 'error',
    from: { path: '^packages/' },
    to: { path: '^apps/' },
  },
  {
    name: 'apps-never-import-each-other',
    severity: 'error',
    from: { path: '^apps/([^/]+)/' },
    to: { path: '^apps/', pathNot: '^apps/$1/' },
  },
  {
    name: 'features-never-import-each-other',
    comment: 'What two features need lies in components, http or a package.',
    severity: 'error',
    from: { path: '^apps/([^/]+)/src/features/([^/]+)/' },
    to: { path: '^apps/$1/src/features/', pathNot: '^apps/$1/src/features/$2/' },
  },
  {
    name: 'pure-packages-touch-no-machine',
    comment: 'The middle is pure: no file, no network, no clock of Node.js.',
    severity: 'error',
    from: { path: pure, pathNot: test },
    to: { dependencyTypes: ['core'] },
  },
  {
    name: 'pure-packages-use-few-libraries',
    comment: 'contracts uses zod, trace-reading uses papaparse, the others use nothing.',
    severity: 'error',
    from: { path: pure, pathNot: test },
    to: { path: 'node_modules/', pathNot: 'node_modules/(@types/)?(zod|papaparse)/' },
  },
  {
    name: 'no-test-in-the-product',
    severity: 'error',
    from: { path: '^(packages|apps)/', pathNot: test },
    to: { path: ['^tests/', test] },
  },
];

module.exports = {
  forbidden: [...houseRules, ...workspaceRules],
  options: {
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.lint.json' },
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '(^|/)(dist|dist-types|coverage)/' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['source', 'import', 'require', 'node', 'default', 'types'],
      mainFields: ['module', 'main', 'types', 'typings'],
    },
  },
};
