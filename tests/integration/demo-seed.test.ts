import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { loadLandIndex } from '@/lib/adapters/land-data';
import { listBoats } from '@/lib/usecases/boats/list-boats';
import type { Context } from '@/lib/usecases/context';
import { listPassages } from '@/lib/usecases/passages/list-passages';
import { openPassage } from '@/lib/usecases/passages/open-passage';
import { signIn } from '@/lib/usecases/accounts/sign-in';
import { seed } from '@/seeds/demo';
import { createTestDatabase, type TestDatabase } from './helpers/database';

let database: TestDatabase;
const demoBefore = process.env.TWOBOW_DEMO;
beforeAll(async () => {
  database = await createTestDatabase();
});
afterAll(async () => {
  if (demoBefore === undefined) delete process.env.TWOBOW_DEMO;
  else process.env.TWOBOW_DEMO = demoBefore;
  await database.drop();
});

async function signedIn(email: string): Promise<Context> {
  const visitor = { db: database.db, address: 'test' };
  const user = await signIn(visitor, { email, password: 'two-bows-one-wind' });
  return { db: database.db, user: user!, now: new Date() };
}

describe('the demo', () => {
  it('is refused where it was not asked for', async () => {
    delete process.env.TWOBOW_DEMO;
    await expect(seed(database.db)).rejects.toThrow('TWOBOW_DEMO');
    expect(await database.db('users')).toEqual([]);
  });

  it('is put in once', async () => {
    process.env.TWOBOW_DEMO = '1';
    await seed(database.db);
    await seed(database.db);
    expect(await database.db('users')).toHaveLength(3);
    expect(await database.db('boats')).toHaveLength(2);
    expect(await database.db('passage_checks')).toHaveLength(1);
  });

  it('gives owner, skipper and crew their roles', async () => {
    expect((await listBoats(await signedIn('owner@example.org'))).boats).toHaveLength(2);
    for (const role of ['skipper', 'crew'] as const) {
      expect((await listBoats(await signedIn(`${role}@example.org`))).boats).toMatchObject([{ role }]);
    }
  });

  it('has a passage with a leg of each state, and names the worst', async () => {
    const skipper = await signedIn('skipper@example.org');
    const [line] = (await listPassages(skipper)).passages;
    const { latestCheck } = await openPassage(skipper, line!.id);
    const states = latestCheck!.result.legs.map((leg) => leg.state);
    expect(new Set(states)).toEqual(new Set(['within', 'thin', 'beyond', 'unknown']));
    expect(line).toMatchObject({ state: 'beyond', worstLeg: { position: states.indexOf('beyond') } });
  });

  it('keeps every leg and its corridor off the land', async () => {
    const land = await loadLandIndex();
    const skipper = await signedIn('skipper@example.org');
    const [line] = (await listPassages(skipper)).passages;
    const { passage } = await openPassage(skipper, line!.id);
    passage.route.slice(1).forEach((to, index) => {
      const from = passage.route[index]!;
      expect(land.crossesLand(from, to)).toBeNull();
      for (let share = 0; share <= 1; share += 0.02) {
        const at = { lat: from.lat + (to.lat - from.lat) * share, lon: from.lon + (to.lon - from.lon) * share };
        expect(land.distanceToShoreM(at)).toBeGreaterThan(to.corridorHalfWidthM);
      }
    });
  });
});
