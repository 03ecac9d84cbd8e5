import { randomBytes } from 'node:crypto';
import knex, { type Knex } from 'knex';

export interface TestDatabase {
  readonly db: Knex;
  readonly url: string;
  /** Closes the pool and drops the database. */
  drop(): Promise<void>;
}

/**
 * A database of one's own with every migration in it: a copy of the migrated template that `npm test` made.
 * Make it in `beforeAll`, drop it in `afterAll`.
 */
export async function createTestDatabase(): Promise<TestDatabase> {
  const adminUrl = required('DATABASE_URL');
  const template = required('TEST_DATABASE_TEMPLATE');
  const name = `twobow_test_${randomBytes(6).toString('hex')}`;
  await asAdmin(adminUrl, (admin) => copyTemplate(admin, name, template));
  const url = withDatabase(adminUrl, name);
  const db = knex({ client: 'pg', connection: url, pool: { min: 0, max: 10 } });
  return {
    db,
    url,
    async drop() {
      await db.destroy();
      await asAdmin(adminUrl, (admin) => admin.raw('DROP DATABASE IF EXISTS ?? WITH (FORCE)', [name]));
    },
  };
}

/** Two copies at one instant find the template in use by each other (SQLSTATE 55006): then wait and repeat. */
async function copyTemplate(admin: Knex, name: string, template: string): Promise<void> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      await admin.raw('CREATE DATABASE ?? TEMPLATE ??', [name, template]);
      return;
    } catch (error) {
      const inUse = (error as { code?: string }).code === '55006';
      if (!inUse || attempt === 50) throw error;
      await new Promise((resolve) => setTimeout(resolve, 100));
    }
  }
}

async function asAdmin(url: string, work: (admin: Knex) => Promise<unknown>): Promise<void> {
  const admin = knex({ client: 'pg', connection: url, pool: { min: 0, max: 1 } });
  try {
    await work(admin);
  } finally {
    await admin.destroy();
  }
}

function withDatabase(url: string, name: string): string {
  const copy = new URL(url);
  copy.pathname = `/${name}`;
  return copy.href;
}

function required(name: string): string {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is not set. Run these tests by “npm test -- integration”.`);
  return value;
}
