import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { insertUser } from '@/db/stores/user-store';
import { createBoat } from '@/lib/usecases/boats/create-boat';
import type { Context } from '@/lib/usecases/context';
import { createPassage } from '@/lib/usecases/passages/create-passage';
import { savePassage } from '@/lib/usecases/passages/save-passage';
import { aBoatSheet } from '@/tests/builders/boat-sheet';
import { aPassagePlan } from '@/tests/builders/passage-plan';
import { addMember, addPerson } from '@/tests/builders/people';
import { createTestDatabase, type TestDatabase } from './helpers/database';

let database: TestDatabase;
let owner: Context;
let boatId: string;
let passageId: string;
beforeAll(async () => {
  database = await createTestDatabase();
  owner = await addPerson(database.db, 'Owner');
  boatId = (await createBoat(owner, 'Test skiff', aBoatSheet())).id;
  passageId = (await createPassage(owner, boatId, { name: 'Test passage' })).id;
  await savePassage(owner, passageId, aPassagePlan(), 1);
});
afterAll(() => database.drop());

/** SQLSTATE of PostgreSQL's refusal. */
async function refusal(statement: PromiseLike<unknown>): Promise<string> {
  try {
    await statement;
    return 'none';
  } catch (error) {
    return (error as { code: string }).code;
  }
}
const CHECK = '23514';
const UNIQUE = '23505';
const RESTRICT = '23001';
const FOREIGN_KEY = '23503';

describe('what the database refuses by itself', () => {
  it.each(['boat_sheets', 'passage_checks'])('changing or deleting a row of %s', async (table) => {
    const before = await database.db(table).select();
    expect(before).toHaveLength(1);
    expect(await refusal(database.db(table).update({ created_at: new Date(0) }))).toBe(RESTRICT);
    expect(await refusal(database.db(table).delete())).toBe(RESTRICT);
    expect(await database.db(table).select()).toEqual(before);
  });

  it('a second version of one number', async () => {
    const [row] = await database.db('boat_sheets').where({ boat_id: boatId });
    const again = { boat_id: boatId, number: 1, schema_version: 1, sheet: '{}', saved_by: row!.saved_by };
    expect(await refusal(database.db('boat_sheets').insert(again as never))).toBe(UNIQUE);
  });

  it('one e-mail twice, in whatever letters', async () => {
    const found = await database.db('users').where({ id: owner.user.id }).first();
    const user = { email: found!.email.toUpperCase(), name: 'Twice', passwordHash: found!.password_hash };
    expect(await insertUser(database.db, user)).toBeNull();
  });

  it('a second role of one person on one boat, and a role that is none', async () => {
    const crew = await addMember(database.db, boatId, 'Crew', 'crew');
    const member = { boat_id: boatId, user_id: crew.user.id };
    expect(await refusal(database.db('boat_members').insert({ ...member, role: 'skipper' }))).toBe(UNIQUE);
    expect(
      await refusal(
        database
          .db('boat_members')
          .where(member)
          .update({ role: 'admiral' as never }),
      ),
    ).toBe(CHECK);
  });

  it.each([
    [{ lat: 86 }, CHECK],
    [{ lat: Number.NaN }, CHECK],
    [{ lon: -181 }, CHECK],
    [{ corridor_half_width_m: 0 }, CHECK],
    [{ position: 0 }, UNIQUE],
    [{ name: '  ' }, CHECK],
    [{ passage_id: '00000000-0000-4000-8000-000000000000' }, FOREIGN_KEY],
  ])('a waypoint with %j', async (wrong, code) => {
    const good = { passage_id: passageId, position: 9, name: 'W', lat: 48, lon: -123, corridor_half_width_m: 500 };
    expect(await refusal(database.db('waypoints').insert({ ...good, ...wrong }))).toBe(code);
  });

  it('a password that is not an argon2id hash', async () => {
    const user = { email: 'plain@example.org', name: 'Plain', password_hash: 'two-bows-one-wind' };
    expect(await refusal(database.db('users').insert(user))).toBe(CHECK);
  });

  it('a state that is none of the four', async () => {
    const [check] = await database.db('passage_checks').select();
    const { id: _id, ...copy } = check!;
    const wrong = { ...copy, inputs: '{}', result: '{}', state: 'fine' };
    expect(await refusal(database.db('passage_checks').insert(wrong as never))).toBe(CHECK);
  });

  it('deleting a boat or a forecast that checks lean on', async () => {
    expect(await refusal(database.db('boats').where({ id: boatId }).delete())).toBe(FOREIGN_KEY);
    expect(await refusal(database.db('forecasts').delete())).toBe(FOREIGN_KEY);
  });
});
