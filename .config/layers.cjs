// The layer rules: a stage imports only from stages to its left and from what stands beside the pipeline.
const stages = [
  'study',
  'site',
  'river',
  'arrange',
  'forms',
  'substructure',
  'takeoff',
  'programme',
  'price',
  'decide',
  'record',
];
const beside = ['model', 'mechanics', 'rules', 'units', 'messages'];
const stage = (name) => `^lib/${name}(/|\\.ts$)`;

const leftToRight = stages.map((name, i) => ({
  name: `${name}-looks-left`,
  comment: `lib/${name} imports only from stages to its left`,
  severity: 'error',
  from: { path: stage(name) },
  to: {
    path: stages
      .slice(i + 1)
      .map(stage)
      .concat(['^lib/(appraise|costTable|index|cli)']),
  },
}));

module.exports = {
  forbidden: [
    {
      name: 'nothing-hangs-on-explanations',
      comment: 'explanations are made only when asked; no stage knows them',
      severity: 'error',
      from: { path: stages.concat(beside, ['actions', 'appraise']).map(stage) },
      to: { path: stage('explain') },
    },
    {
      name: 'one-door-to-schemas',
      comment: 'schemas are made only after they have been told not to compile themselves, see lib/zod.ts',
      severity: 'error',
      from: { path: '^(lib|notebooks)', pathNot: '^lib/zod\\.ts$' },
      to: { path: 'node_modules/zod/' },
    },
    { name: 'no-circle', severity: 'error', from: {}, to: { circular: true } },
    ...leftToRight,
    {
      name: 'model-imports-nothing',
      severity: 'error',
      from: { path: stage('model') },
      to: { path: '^(lib|notebooks|node_modules)', pathNot: stage('model') },
    },
    {
      name: 'beside-knows-no-stage',
      severity: 'error',
      from: { path: beside.concat(['actions']).map(stage) },
      to: { path: stages.map(stage) },
    },
    {
      name: 'lib-knows-no-page',
      severity: 'error',
      from: { path: '^lib' },
      to: { path: '^(notebooks|test)' },
    },
    {
      name: 'pages-use-the-front-door',
      severity: 'error',
      from: { path: '^notebooks' },
      to: { path: '^lib', pathNot: '^lib/index\\.ts$' },
    },
    {
      name: 'only-the-command-line-touches-node',
      severity: 'error',
      from: { path: '^lib', pathNot: '^lib/cli' },
      to: { dependencyTypes: ['core'] },
    },
    {
      name: 'cli-stands-alone',
      severity: 'error',
      from: { path: '^lib', pathNot: '^lib/cli' },
      to: { path: '^lib/cli' },
    },
  ],
  options: {
    doNotFollow: { path: 'node_modules' },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.json' },
    enhancedResolveOptions: { extensions: ['.ts', '.js', '.json'] },
  },
};
