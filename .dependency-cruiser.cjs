/** Arrows point down: apps -> contracts, trace -> isolation -> harness. `demo` is data for seeding and tests. */
const test = '\\.(test|spec)\\.tsx?$|/testing/|/test/';

/** A rule that a folder may import nothing of the workspace but `allowed`. */
const only = (name, from, allowed) => ({
  name,
  severity: 'error',
  from: { path: `^${from}`, pathNot: test },
  to: { path: '^(apps|libs)/', pathNot: [from, ...allowed].map((path) => `^${path}`) },
});

/** Libraries that the pure libs may use; all else (Node's modules, React, Nest) is I/O or a framework. */
const purePackages = '^node_modules/(zod|xstate)/';

module.exports = {
  forbidden: [
    { name: 'no-circular', severity: 'error', from: {}, to: { circular: true } },
    only('harness-is-the-bottom', 'libs/harness', []),
    only('isolation-knows-harness', 'libs/isolation', ['libs/harness']),
    only('trace-knows-isolation-and-harness', 'libs/trace', ['libs/isolation', 'libs/harness']),
    only('contracts-know-the-libs', 'libs/contracts', [
      'libs/trace',
      'libs/isolation',
      'libs/harness',
    ]),
    only('demo-knows-the-libs', 'libs/demo', ['libs/trace', 'libs/isolation', 'libs/harness']),
    only('web-knows-no-api', 'apps/web/', [
      'libs/contracts',
      'libs/trace',
      'libs/isolation',
      'libs/harness',
    ]),
    only('api-knows-no-web', 'apps/api', ['libs/']),
    {
      name: 'libs-are-pure',
      severity: 'error',
      from: { path: '^libs/', pathNot: test },
      to: { path: '^node_modules/', pathNot: purePackages },
    },
    {
      name: 'libs-do-no-io',
      severity: 'error',
      from: { path: '^libs/', pathNot: test },
      to: { dependencyTypes: ['core'] },
    },
    {
      name: 'no-library-by-its-inside',
      comment: 'Import @lampwright/<name>, not its files.',
      severity: 'error',
      from: { path: '^(apps|libs)/([^/]+)/' },
      to: { path: '^libs/([^/]+)/src/(?!index|testing/index)', pathNot: '^$1/$2/' },
    },
    {
      name: 'feature-to-feature',
      comment: 'What two features share lives in apps/web/src/ui, lib or drawing.',
      severity: 'error',
      from: { path: '^apps/web/src/features/([^/]+)/', pathNot: test },
      to: { path: '^apps/web/src/features/', pathNot: '^apps/web/src/features/$1/' },
    },
    {
      name: 'shared-knows-no-feature',
      severity: 'error',
      from: { path: '^apps/web/src/(ui|lib|theme|drawing|i18n)/', pathNot: test },
      to: { path: '^apps/web/src/(features|app)/' },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.base.json' },
    enhancedResolveOptions: { extensions: ['.ts', '.tsx', '.mts', '.js', '.json'] },
  },
};
