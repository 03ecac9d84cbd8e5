import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ConflictError, NotFoundError } from '@/lib/errors';
import { checkPassage } from '@/lib/passage-check/check-passage';
import { planToPassage } from '@/lib/schemas/to-passage';
import { createBoat } from '@/lib/usecases/boats/create-boat';
import { hideBoat } from '@/lib/usecases/boats/hide-boat';
import { saveBoatSheet } from '@/lib/usecases/boats/save-boat-sheet';
import type { Context } from '@/lib/usecases/context';
import { createPassage } from '@/lib/usecases/passages/create-passage';
import { hidePassage } from '@/lib/usecases/passages/hide-passage';
import { listPassageChecks } from '@/lib/usecases/passages/list-passage-checks';
import { listPassages } from '@/lib/usecases/passages/list-passages';
import { openPassage } from '@/lib/usecases/passages/open-passage';
import { restorePassage } from '@/lib/usecases/passages/restore-passage';
import { savePassage } from '@/lib/usecases/passages/save-passage';
import { aBoatSheet } from '@/tests/builders/boat-sheet';
import { aPassagePlan } from '@/tests/builders/passage-plan';
import { addPerson, testNow } from '@/tests/builders/people';
import { createTestDatabase, type TestDatabase } from './helpers/database';

let database: TestDatabase;
beforeAll(async () => {
  database = await createTestDatabase();
});
afterAll(() => database.drop());

async function aPassage(): Promise<{ owner: Context; boatId: string; passageId: string }> {
  const owner = await addPerson(database.db, 'Owner');
  const boat = await createBoat(owner, 'Test skiff', aBoatSheet());
  const passage = await createPassage(owner, boat.id, { name: 'Draft', zone: 'America/Los_Angeles' });
  return { owner, boatId: boat.id, passageId: passage.id };
}

describe('passages', () => {
  it('opens a new one empty, departing at the next full hour, without a check', async () => {
    const { owner, boatId, passageId } = await aPassage();
    const opened = await openPassage(owner, passageId);
    expect(opened.passage).toMatchObject({ boatId, name: 'Draft', revision: 1, route: [], streamRows: [], limits: {} });
    expect(opened.passage.departure).toBe('2026-06-01T13:00:00.000Z');
    expect(opened).toMatchObject({ latestCheck: null, sheetIsNewer: false, role: 'owner' });
    expect((await listPassages(owner)).passages[0]).toMatchObject({ state: null, worstLeg: null });
  });

  it('gives back the plan as it was saved', async () => {
    const { owner, passageId } = await aPassage();
    const plan = aPassagePlan({ streamRows: [{ time: '2026-06-01T12:00:00Z', towardDeg: 10, kn: 1.5 }] });
    await savePassage(owner, passageId, plan, 1);
    const { passage } = await openPassage(owner, passageId);
    expect(passage).toMatchObject({
      ...plan,
      departure: new Date(plan.departure).toISOString(),
      wind: { ...plan.wind, issuedAt: new Date(plan.wind.issuedAt).toISOString() },
      revision: 2,
    });
  });

  it('stores the check it made, pinned to the newest boat sheet', async () => {
    const { owner, boatId, passageId } = await aPassage();
    await saveBoatSheet(owner, boatId, aBoatSheet({ spanM: 3.2 }), 1);
    const plan = aPassagePlan();
    const saved = await savePassage(owner, passageId, plan, 1);
    const expected = checkPassage(planToPassage(plan, aBoatSheet({ spanM: 3.2 }), testNow.getTime()));
    expect(saved.revision).toBe(2);
    expect(saved.check.sheetNumber).toBe(2);
    expect(saved.check.result).toEqual(JSON.parse(JSON.stringify(expected)));
    const opened = await openPassage(owner, passageId);
    expect(opened.latestCheck).toEqual(saved.check);
    expect(opened.sheetIsNewer).toBe(false);
    const [line] = (await listPassages(owner)).passages;
    expect(line).toMatchObject({ state: expected.state, largestLoadShare: expected.totals.largestLoadShare });
    const worst = expected.legs[line!.worstLeg!.position]!;
    expect(line!.worstLeg).toMatchObject({ from: worst.from, to: worst.to });
    expect(worst.state).toBe(expected.state);
  });

  it('says when the boat sheet has got a newer version than the check', async () => {
    const { owner, boatId, passageId } = await aPassage();
    await savePassage(owner, passageId, aPassagePlan(), 1);
    await saveBoatSheet(owner, boatId, aBoatSheet({ spanM: 3.3 }), 1);
    expect(await openPassage(owner, passageId)).toMatchObject({
      sheetIsNewer: true,
      latestCheck: { sheetNumber: 1 },
      boat: { sheetNumber: 2 },
    });
    await savePassage(owner, passageId, aPassagePlan(), 2);
    expect((await openPassage(owner, passageId)).sheetIsNewer).toBe(false);
    expect((await listPassageChecks(owner, passageId)).map((check) => check.sheetNumber)).toEqual([2, 1]);
  });

  it('refuses a save based on an older revision and changes nothing', async () => {
    const { owner, passageId } = await aPassage();
    await savePassage(owner, passageId, aPassagePlan({ name: 'First' }), 1);
    await expect(savePassage(owner, passageId, aPassagePlan({ name: 'Second' }), 1)).rejects.toBeInstanceOf(
      ConflictError,
    );
    expect((await openPassage(owner, passageId)).passage.name).toBe('First');
    expect(await listPassageChecks(owner, passageId)).toHaveLength(1);
  });

  it('lets one of several saves at once through', async () => {
    const { owner, passageId } = await aPassage();
    const names = ['One', 'Two', 'Three'];
    const saves = await Promise.allSettled(
      names.map((name) => savePassage(owner, passageId, aPassagePlan({ name }), 1)),
    );
    expect(saves.map((save) => save.status).sort()).toEqual(['fulfilled', 'rejected', 'rejected']);
  });

  it('keeps a wind once while it does not change, and keeps the old one when it does', async () => {
    const { owner, passageId } = await aPassage();
    const forecasts = () => database.db('forecasts').where({ passage_id: passageId }).orderBy('number');
    await savePassage(owner, passageId, aPassagePlan(), 1);
    await savePassage(owner, passageId, aPassagePlan({ name: 'Only the name' }), 2);
    expect(await forecasts()).toHaveLength(1);
    const wind = { ...aPassagePlan().wind, issuedAt: '2026-06-01T11:00:00Z' };
    await savePassage(owner, passageId, aPassagePlan({ wind }), 3);
    expect((await forecasts()).map((row) => row.issued_at.toISOString())).toEqual([
      '2026-06-01T10:00:00.000Z',
      '2026-06-01T11:00:00.000Z',
    ]);
  });

  it('shows an old forecast as not known when the plan is saved again later', async () => {
    const { owner, passageId } = await aPassage();
    expect((await savePassage(owner, passageId, aPassagePlan(), 1)).check.state).not.toBe('unknown');
    const nextDay = { ...owner, now: new Date(testNow.getTime() + 86_400_000) };
    expect((await savePassage(nextDay, passageId, aPassagePlan(), 2)).check.state).toBe('unknown');
  });

  it('hides and brings back; a hidden boat hides her passages', async () => {
    const { owner, boatId, passageId } = await aPassage();
    await hidePassage(owner, passageId);
    await expect(openPassage(owner, passageId)).rejects.toBeInstanceOf(NotFoundError);
    expect(await listPassages(owner)).toMatchObject({ passages: [], hidden: [{ id: passageId }] });
    await restorePassage(owner, passageId);
    expect((await openPassage(owner, passageId)).passage.id).toBe(passageId);
    await hideBoat(owner, boatId);
    await expect(openPassage(owner, passageId)).rejects.toBeInstanceOf(NotFoundError);
    expect((await listPassages(owner)).passages).toEqual([]);
  });

  it('answers for an id that is none as for one that is not there', async () => {
    const { owner } = await aPassage();
    await expect(openPassage(owner, 'not-an-id')).rejects.toBeInstanceOf(NotFoundError);
    await expect(openPassage(owner, '00000000-0000-4000-8000-000000000000')).rejects.toBeInstanceOf(NotFoundError);
  });
});
