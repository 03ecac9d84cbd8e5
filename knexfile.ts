import type { Knex } from 'knex';
import { env } from './lib/env';

const config: Knex.Config = {
  client: 'pg',
  connection: env().databaseUrl,
  pool: { min: 0, max: 4 },
  migrations: { directory: './migrations', extension: 'ts', loadExtensions: ['.ts'] },
  seeds: { directory: './seeds', extension: 'ts', loadExtensions: ['.ts'] },
};

export default config;
