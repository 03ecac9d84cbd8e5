import knex, { type Knex } from 'knex';
import { env } from '@/lib/env';

const kept = globalThis as typeof globalThis & { __twobowDb?: Knex };

/**
 * The one connection pool of this process, made when first asked for, so that a build needs no database.
 * It hangs on globalThis because a development server reloads modules and would open a pool each time.
 */
export function getDb(): Knex {
  kept.__twobowDb ??= knex({
    client: 'pg',
    connection: { connectionString: env().databaseUrl, application_name: 'twobow' },
    pool: { min: 0, max: 10 },
    acquireConnectionTimeout: 10_000,
  });
  return kept.__twobowDb;
}
