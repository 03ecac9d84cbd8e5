/**
 * Who may import whom. What is not listed is not allowed. `to` names folders or files of the project,
 * `packages` what may come from node_modules or Node.js ('*': anything that `keepers` does not keep).
 */
const low = ['lib/units', 'lib/errors'];
const ground = [...low, 'lib/geo', 'lib/time'];
const core = [
  ...ground,
  'lib/rigging',
  'lib/polars',
  'lib/weather',
  'lib/tides',
  'lib/passages',
  'lib/reef-calls',
  'lib/float-plans',
  'lib/logbook',
  'lib/calibration',
  'lib/passage-check',
  'lib/access',
  'lib/schemas',
];
const anything = ['*'];

/** @type {Record<string, { to: string[], packages?: string[] }>} */
export const arrows = {
  // The pure core, from the bottom up.
  'lib/units': { to: [] },
  'lib/errors': { to: [] },
  'lib/access': { to: low },
  'lib/geo': { to: low, packages: ['@turf/turf', 'flatbush', 'geographiclib-geodesic', 'geomagnetism'] },
  'lib/time': { to: low, packages: ['suncalc'] },
  'lib/rigging': { to: ground },
  'lib/polars': { to: ground },
  'lib/weather': { to: ground },
  'lib/tides': { to: ground },
  'lib/passages': { to: [...ground, 'lib/rigging', 'lib/polars', 'lib/weather', 'lib/tides'] },
  'lib/reef-calls': { to: [...ground, 'lib/rigging', 'lib/polars', 'lib/weather', 'lib/tides', 'lib/passages'] },
  'lib/float-plans': { to: [...ground, 'lib/rigging', 'lib/polars', 'lib/weather', 'lib/tides', 'lib/passages'] },
  'lib/logbook': { to: ground },
  'lib/calibration': { to: [...ground, 'lib/polars', 'lib/rigging', 'lib/weather', 'lib/logbook'] },
  'lib/passage-check': {
    to: [
      ...ground,
      'lib/rigging',
      'lib/polars',
      'lib/weather',
      'lib/tides',
      'lib/passages',
      'lib/reef-calls',
      'lib/float-plans',
    ],
  },
  'lib/schemas': { to: core, packages: ['zod'] },

  // Everything that touches the world.
  'lib/env': { to: [], packages: ['zod'] },
  'lib/adapters': { to: [...core, 'lib/env'], packages: anything },
  'lib/usecases': {
    to: [...core, 'db', 'lib/jobs/queue', 'lib/jobs/definitions'],
    packages: ['knex', 'zod', 'rate-limiter-flexible', '@node-rs/argon2', 'node:crypto'],
  },
  'lib/jobs': { to: [...core, 'lib/env', 'db'], packages: anything },
  'lib/jobs/handlers': { to: [...core, 'lib/usecases', 'lib/adapters', 'lib/jobs'], packages: anything },
  'lib/jobs/worker': { to: [...core, 'lib/env', 'db', 'lib/adapters', 'lib/jobs'], packages: anything },
  'lib/web': { to: [...core, 'lib/env', 'lib/usecases', 'lib/adapters', 'db'], packages: anything },
  'lib/client': { to: core, packages: anything },
  db: { to: [...core, 'lib/env'], packages: anything },
  migrations: { to: [], packages: ['knex'] },
  seeds: { to: [...core, 'lib/env', 'db', 'lib/usecases', 'lib/adapters'], packages: anything },

  // What people see.
  'components/ui': { to: [], packages: anything },
  'components/charts': { to: [...core, 'components/ui'], packages: anything },
  'components/map': { to: [...core, 'components/ui', 'components/charts', 'lib/client'], packages: anything },
  components: { to: [...core, 'components', 'lib/client'], packages: anything },
  app: { to: [...core, 'components', 'lib/web', 'lib/usecases', 'lib/client'], packages: anything },
  proxy: { to: ['lib/web', 'lib/env'], packages: anything },
};

/** Packages that only some layers may import, wherever '*' stands. A trailing slash keeps a whole scope. */
export const keepers = [
  { packages: ['maplibre-gl', 'react-map-gl', 'pmtiles'], by: ['components/map'] },
  { packages: ['d3-scale', 'd3-shape', 'd3-array'], by: ['components/charts'] },
  { packages: ['knex', 'pg'], by: ['db', 'migrations', 'seeds', 'lib/usecases', 'lib/jobs', 'lib/web'] },
  { packages: ['next', 'next-auth'], by: ['app', 'components', 'lib/web', 'proxy'] },
  { packages: ['react', 'react-dom'], by: ['app', 'components', 'lib/web', 'lib/client'] },
  { packages: ['nodemailer'], by: ['lib/adapters'] },
  { packages: ['server-only'], by: ['app', 'lib/web'] },
];

export const coreFolders = core;
