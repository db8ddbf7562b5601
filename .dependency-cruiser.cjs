// The walls of the house. Type-only imports count: they are where layers leak.
const only = (name, from, ...allowed) => ({
  name,
  severity: 'error',
  from: { path: `^${from}/` },
  to: {
    path: '^(shared|src|server|scenarios|tests)/',
    pathNot: `^(${[from, ...allowed].join('|')})/`,
  },
});
const noPackages = (name, from, pathNot) => ({
  name,
  severity: 'error',
  from: { path: from },
  to: {
    dependencyTypes: [
      'npm',
      'npm-dev',
      'npm-peer',
      'core',
      'unknown',
      'npm-no-pkg',
      'npm-optional',
    ],
    ...(pathNot ? { pathNot } : {}),
  },
});

module.exports = {
  forbidden: [
    { name: 'no-cycles', severity: 'error', from: {}, to: { circular: true } },
    { name: 'resolves', severity: 'error', from: {}, to: { couldNotResolve: true } },
    {
      name: 'no-development-packages',
      severity: 'error',
      from: { path: '^(shared|src|server)/' },
      to: { dependencyTypes: ['npm-dev'], pathNot: 'node_modules/@types/' },
    },
    only('src-uses-shared-only', 'src', 'shared'),
    only('server-uses-shared-only', 'server', 'shared'),
    only('shared-stands-alone', 'shared'),
    only('engine-stands-alone', 'shared/engine'),
    noPackages('engine-uses-no-package', '^shared/engine/'),
    noPackages('shared-uses-zod-only', '^shared/', 'node_modules/zod/'),
    only('instruments-on-engine', 'shared/instruments', 'shared/engine'),
    only('oven-on-engine', 'shared/oven', 'shared/engine'),
    only('bench-on-oven', 'shared/bench', 'shared/engine', 'shared/instruments', 'shared/oven'),
    only(
      'reasoning-on-bench',
      'shared/reasoning',
      'shared/engine',
      'shared/instruments',
      'shared/oven',
      'shared/bench',
    ),
    only(
      'assessment-on-bench',
      'shared/assessment',
      'shared/engine',
      'shared/instruments',
      'shared/oven',
      'shared/bench',
      'shared/reasoning',
      'shared/scenario',
    ),
    only(
      'scenario-on-oven',
      'shared/scenario',
      'shared/engine',
      'shared/instruments',
      'shared/oven',
    ),
    only(
      'contracts-on-bench',
      'shared/contracts',
      'shared/oven',
      'shared/scenario',
      'shared/bench',
      'shared/assessment',
      'shared/instruments',
    ),
    {
      name: 'konva-in-glyphs-and-layers',
      severity: 'error',
      from: { path: '^src/', pathNot: '^src/bench/(glyphs|layers)/' },
      to: { path: 'node_modules/(konva|react-konva)/' },
    },
    {
      name: 'typeorm-in-entities-and-stores',
      severity: 'error',
      from: { path: '^server/', pathNot: '(\\.entity\\.ts$|-store\\.ts$|^server/database/)' },
      to: { path: 'node_modules/(typeorm|pg)/' },
    },
  ],
  options: {
    tsPreCompilationDeps: true,
    tsConfig: { fileName: 'tsconfig.json' },
    doNotFollow: { path: 'node_modules' },
    exclude: { path: '(^dist/|\\.css$)' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'types', 'default'],
    },
  },
};
