/*
 * The one-way streets of the architecture (DEVELOPERS.md draws them). `tests/architecture.test.ts` runs this over
 * the tree and proves, rule by rule, that a planted violation is caught.
 */

const CORE = [
  'units',
  'physics',
  'sun',
  'weather',
  'simulation',
  'testbench',
  'calibration',
  'economics',
  'sizing',
  'checks',
];
const CORE_FOLDERS = `^lib/(${CORE.join('|')})/`;

/** What each room of the core may import beside itself. Whatever is missing here is forbidden. */
const CORE_STREETS = {
  units: [],
  physics: ['units'],
  sun: ['units', 'physics', 'weather'],
  weather: ['units', 'physics', 'sun'],
  simulation: ['units', 'physics', 'sun', 'weather'],
  testbench: ['units', 'physics', 'sun', 'weather', 'simulation'],
  calibration: ['units'],
  economics: ['units', 'physics', 'simulation'],
  checks: ['units', 'physics', 'sun', 'weather', 'simulation', 'economics'],
  sizing: ['units', 'physics', 'sun', 'weather', 'simulation', 'economics', 'checks'],
};

const PACKAGE = {
  dependencyTypes: ['npm', 'npm-dev', 'npm-optional', 'npm-peer', 'npm-no-pkg', 'npm-unknown'],
};

const forbid = (name, from, to, comment) => ({ name, severity: 'error', comment, from, to });

const coreStreets = CORE.map((room) =>
  forbid(
    `${room}-one-way`,
    { path: `^lib/${room}/` },
    { path: CORE_FOLDERS, pathNot: `^lib/(${[room, ...CORE_STREETS[room]].join('|')})/` },
    `lib/${room} may import of the core: ${CORE_STREETS[room].join(', ') || 'nothing'}.`,
  ),
);

const coreRules = [
  forbid(
    'physics-knows-only-constants',
    { path: '^lib/physics/' },
    { path: '^lib/units/', pathNot: '^lib/units/constants' },
    'Physics calculates in SI; parsing and display of units are not its business.',
  ),
  forbid(
    'core-stands-alone',
    { path: CORE_FOLDERS },
    { path: '^(app|components|workers|db|migrations|tests|lib)/', pathNot: CORE_FOLDERS },
    'The core imports nothing of the product but itself: not even the types of the schemas.',
  ),
  forbid(
    'core-no-node',
    { path: CORE_FOLDERS },
    { dependencyTypes: ['core'] },
    'The core runs in a browser worker.',
  ),
  forbid(
    'sun-only-suncalc',
    { path: '^lib/sun/' },
    { ...PACKAGE, pathNot: 'node_modules/suncalc/' },
    'Of npm, lib/sun may import suncalc only.',
  ),
  forbid(
    'mathjs-only-where-said',
    { path: ['^lib/testbench/', '^lib/units/parse'] },
    { ...PACKAGE, pathNot: 'node_modules/mathjs/' },
    'Of npm, lib/testbench and lib/units/parse may import mathjs only.',
  ),
  forbid(
    'core-no-packages',
    { path: CORE_FOLDERS, pathNot: ['^lib/sun/', '^lib/testbench/', '^lib/units/parse'] },
    PACKAGE,
    'No other part of the core imports a package.',
  ),
];

const layerRules = [
  forbid(
    'schemas-types-of-core-only',
    { path: '^lib/schemas/' },
    { path: CORE_FOLDERS, pathNot: '^lib/units/constants', dependencyTypesNot: ['type-only'] },
    'Schemas describe what the core takes; they do not run it.',
  ),
  forbid(
    'reference-only-core',
    { path: '^lib/reference/' },
    { path: '^(lib|node_modules)/', pathNot: [CORE_FOLDERS, '^lib/reference/'] },
    'A check calls the core, on the data of the product, and nothing else.',
  ),
  forbid(
    'reference-in-browser',
    { path: '^lib/reference/' },
    { dependencyTypes: ['core'] },
    'The checks run in a browser worker too.',
  ),
  forbid(
    'schemas-low',
    { path: '^lib/schemas/' },
    { path: '^(app|components|workers|db|lib/(server|auth|mail|study))/' },
    'Schemas stand below everything that uses them.',
  ),
  forbid(
    'lib-below',
    { path: '^lib/' },
    { path: '^(app|components|workers|migrations|tests)/' },
    'lib knows nothing of the pages, the parts of pages and the workers.',
  ),
  forbid(
    'lib-no-framework',
    { path: '^lib/', pathNot: '^lib/(server|auth)/' },
    { path: 'node_modules/(react|react-dom|next|next-auth|@auth|radix-ui|react-hook-form)/' },
    'lib knows neither React nor Next.',
  ),
  forbid(
    'lib-no-database',
    { path: '^lib/', pathNot: '^lib/server/' },
    { path: ['^db/', 'node_modules/(pg|kysely|@types/pg)/'] },
    'Only lib/server reaches the database.',
  ),
  forbid(
    'components-below-app',
    { path: '^components/' },
    { path: '^(app|db|migrations|tests|lib/(server|auth|mail))/' },
    'Components draw what they are handed.',
  ),
  forbid(
    'app-not-db',
    { path: '^app/' },
    { path: ['^(db|migrations|tests)/', 'node_modules/(pg|kysely|@types/pg)/'] },
    'Pages and actions reach the database through lib/server.',
  ),
  forbid(
    'workers-only-lib',
    { path: '^workers/' },
    {
      path: [
        '^(app|components|db|migrations|tests|lib/(server|auth|mail))/',
        'node_modules/(react|react-dom|next|pg|kysely)/',
      ],
    },
    'Workers run the core; scripts import them without the server-only marker.',
  ),
  forbid(
    'db-below-server',
    { path: '^(db|migrations)/' },
    { path: ['^(app|components|workers|tests|lib/server)/', 'node_modules/(react|react-dom|next)/'] },
    'The database layer knows no pages and decides nothing.',
  ),
  forbid(
    'data-low',
    { path: '^data/' },
    { path: '^(app|components|workers|db|migrations|tests|lib/(server|auth|mail))/' },
    'Data are values; at most they name the types of lib.',
  ),
  forbid(
    'server-only-in-server',
    { pathNot: ['^lib/(server|auth)/', '^tests/'] },
    { path: 'node_modules/server-only/|node_modules/next/dist/compiled/server-only/|^server-only$' },
    'The marker throws in plain Node: scripts and workers could not import what carries it.',
  ),
];

const hygieneRules = [
  forbid(
    'no-circle',
    {},
    { circular: true, viaOnly: { dependencyTypesNot: ['type-only'] } },
    'Modules that need each other at run time are one module.',
  ),
  forbid(
    'no-unresolved',
    {},
    { couldNotResolve: true, pathNot: '^server-only$' },
    'An import that leads nowhere is not checked by any other rule.',
  ),
  forbid(
    'no-dev-packages',
    // The method pages are written while the product is built, when the compiler is at hand.
    { path: '^(app|components|lib|workers|db|data)/', pathNot: '^lib/method/(parse|read|named)-' },
    { dependencyTypes: ['npm-dev'], dependencyTypesNot: ['type-only'], pathNot: 'node_modules/@types/' },
    'The product must run without the packages of its tests.',
  ),
  forbid('no-tests-in-product', { pathNot: '^tests/' }, { path: '^tests/' }, 'Nothing depends on the tests.'),
];

module.exports = {
  forbidden: [...coreStreets, ...coreRules, ...layerRules, ...hygieneRules],
  options: {
    tsConfig: { fileName: 'tsconfig.json' },
    // Without this the imports of types alone are not seen.
    tsPreCompilationDeps: true,
    doNotFollow: { path: 'node_modules' },
    enhancedResolveOptions: {
      exportsFields: ['exports'],
      conditionNames: ['import', 'types', 'node', 'default'],
    },
  },
};
