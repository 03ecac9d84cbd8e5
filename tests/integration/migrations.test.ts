import { readdir } from 'node:fs/promises';
import type { Knex } from 'knex';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { createTestDatabase, type TestDatabase } from './helpers/database';

let database: TestDatabase;
beforeAll(async () => {
  database = await createTestDatabase();
});
afterAll(() => database.drop());

/** The project's migrations, loaded by the test runner, which reads TypeScript. */
const settings = {
  migrationSource: {
    getMigrations: async () => (await readdir('migrations')).sort(),
    getMigrationName: (name: string) => name,
    getMigration: (name: string): Promise<Knex.Migration> => import(`../../migrations/${name.replace(/\.ts$/, '')}.ts`),
  },
};

async function tableNames(): Promise<string[]> {
  const { rows } = await database.db.raw<{ rows: { table_name: string }[] }>(
    `SELECT table_name FROM information_schema.tables
     WHERE table_schema = 'public' AND table_name NOT LIKE 'knex_%' ORDER BY 1`,
  );
  return rows.map((row) => row.table_name);
}

async function columns(): Promise<unknown> {
  const { rows } = await database.db.raw<{ rows: unknown[] }>(
    `SELECT table_name, column_name, data_type, is_nullable, column_default FROM information_schema.columns
     WHERE table_schema = 'public' ORDER BY 1, 2`,
  );
  return rows;
}

describe('migrations', () => {
  it('go all the way down, leave nothing, and come up the same', async () => {
    const before = { tables: await tableNames(), columns: await columns() };
    expect(before.tables).toContain('passage_checks');
    await database.db.migrate.rollback(settings, true);
    expect(await tableNames()).toEqual([]);
    const { rows } = await database.db.raw<{ rows: unknown[] }>(
      `SELECT proname FROM pg_proc JOIN pg_namespace n ON n.oid = pronamespace WHERE n.nspname = 'public'`,
    );
    expect(rows).toEqual([]);
    await database.db.migrate.latest(settings);
    expect({ tables: await tableNames(), columns: await columns() }).toEqual(before);
  });
});
