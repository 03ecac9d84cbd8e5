import type { Knex } from 'knex';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';

export interface ThrottleRule {
  /** Kebab-case name of what is counted; also the prefix of its keys. */
  readonly name: string;
  readonly tries: number;
  readonly perSeconds: number;
}

const limiters = new WeakMap<Knex, Map<string, RateLimiterPostgres>>();

/** Counts one try of the key under the rule. Null where it is allowed, else the seconds to wait. */
export async function countTry(db: Knex, rule: ThrottleRule, key: string): Promise<number | null> {
  try {
    await limiterOf(db, rule).consume(key);
    return null;
  } catch (error) {
    if (error instanceof RateLimiterRes) return Math.max(1, Math.ceil(error.msBeforeNext / 1000));
    throw error;
  }
}

/** Forgets the tries of the key: it proved itself. */
export async function forgetTries(db: Knex, rule: ThrottleRule, key: string): Promise<void> {
  await limiterOf(db, rule).delete(key);
}

function limiterOf(db: Knex, rule: ThrottleRule): RateLimiterPostgres {
  const ofDb = limiters.get(db) ?? new Map<string, RateLimiterPostgres>();
  limiters.set(db, ofDb);
  const limiter =
    ofDb.get(rule.name) ??
    new RateLimiterPostgres({
      storeClient: db,
      storeType: 'knex',
      tableName: 'throttle_points',
      tableCreated: true,
      keyPrefix: rule.name,
      points: rule.tries,
      duration: rule.perSeconds,
    });
  ofDb.set(rule.name, limiter);
  return limiter;
}

/** Takes one counted try back: it was no guess. */
export async function giveBackTry(db: Knex, rule: ThrottleRule, key: string): Promise<void> {
  await limiterOf(db, rule).reward(key, 1);
}
