import 'server-only';
import { getDb } from '@/db/knex';
import { isDatabaseWell } from '@/lib/usecases/health/is-database-well';
import { log } from '@/lib/web/log';

export interface Health {
  readonly status: 'ok' | 'failing';
  readonly database: 'ok' | 'down';
}

/** The state of this server, for whoever watches it. */
export async function health(): Promise<Health> {
  if (await databaseAnswers()) return { status: 'ok', database: 'ok' };
  log.warn('the database does not answer');
  return { status: 'failing', database: 'down' };
}

/** Settings that name no database count as none. */
async function databaseAnswers(): Promise<boolean> {
  try {
    return await isDatabaseWell(getDb());
  } catch {
    return false;
  }
}
