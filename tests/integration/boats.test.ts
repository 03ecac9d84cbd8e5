import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ConflictError, NotAllowedError, NotFoundError } from '@/lib/errors';
import { createBoat } from '@/lib/usecases/boats/create-boat';
import { hideBoat } from '@/lib/usecases/boats/hide-boat';
import { listBoatSheets } from '@/lib/usecases/boats/list-boat-sheets';
import { listBoats } from '@/lib/usecases/boats/list-boats';
import { openBoat } from '@/lib/usecases/boats/open-boat';
import { renameBoat } from '@/lib/usecases/boats/rename-boat';
import { restoreBoat } from '@/lib/usecases/boats/restore-boat';
import { saveBoatSheet } from '@/lib/usecases/boats/save-boat-sheet';
import { aBoatSheet } from '@/tests/builders/boat-sheet';
import { addMember, addPerson, testNow } from '@/tests/builders/people';
import { createTestDatabase, type TestDatabase } from './helpers/database';

let database: TestDatabase;
beforeAll(async () => {
  database = await createTestDatabase();
});
afterAll(() => database.drop());

const later = (days: number) => new Date(testNow.getTime() + days * 86_400_000);

describe('boats and their sheets', () => {
  it('makes a boat with version 1, owned by who made her', async () => {
    const owner = await addPerson(database.db, 'Owner');
    const { id } = await createBoat(owner, 'Test skiff', aBoatSheet({ notes: 'as built' }));
    const opened = await openBoat(owner, id);
    expect(opened).toMatchObject({ name: 'Test skiff', role: 'owner', newestNumber: 1 });
    expect(opened.version.sheet).toEqual(aBoatSheet({ notes: 'as built' }));
    expect((await listBoats(owner)).boats).toMatchObject([{ id, name: 'Test skiff', role: 'owner', sheetNumber: 1 }]);
  });

  it('saves a new numbered version and keeps the old one as it was', async () => {
    const owner = await addPerson(database.db, 'Owner');
    const { id } = await createBoat(owner, 'Test skiff', aBoatSheet());
    expect(await saveBoatSheet(owner, id, aBoatSheet({ spanM: 3.2 }), 1)).toEqual({ number: 2 });
    expect((await openBoat(owner, id)).version.sheet.spanM).toBe(3.2);
    expect((await openBoat(owner, id, 1)).version.sheet.spanM).toBe(3);
    expect((await listBoatSheets(owner, id)).map((line) => line.number)).toEqual([2, 1]);
    await expect(openBoat(owner, id, 3)).rejects.toBeInstanceOf(NotFoundError);
  });

  it('refuses a version based on one that is no longer the newest', async () => {
    const owner = await addPerson(database.db, 'Owner');
    const { id } = await createBoat(owner, 'Test skiff', aBoatSheet());
    await saveBoatSheet(owner, id, aBoatSheet({ spanM: 3.1 }), 1);
    await expect(saveBoatSheet(owner, id, aBoatSheet({ spanM: 3.5 }), 1)).rejects.toBeInstanceOf(ConflictError);
    expect((await openBoat(owner, id)).version.sheet.spanM).toBe(3.1);
  });

  it('lets one of several saves at once through', async () => {
    const owner = await addPerson(database.db, 'Owner');
    const { id } = await createBoat(owner, 'Test skiff', aBoatSheet());
    const saves = await Promise.allSettled(
      [3.1, 3.2, 3.3, 3.4].map((spanM) => saveBoatSheet(owner, id, aBoatSheet({ spanM }), 1)),
    );
    expect(saves.filter((save) => save.status === 'fulfilled')).toHaveLength(1);
    const reasons = saves.flatMap((save) => (save.status === 'rejected' ? [save.reason] : []));
    expect(reasons.every((reason) => reason instanceof ConflictError)).toBe(true);
    expect(await listBoatSheets(owner, id)).toHaveLength(2);
  });

  it('hides a boat from everybody, and brings her back within 30 days', async () => {
    const owner = await addPerson(database.db, 'Owner');
    const { id } = await createBoat(owner, 'Test skiff', aBoatSheet());
    const crew = await addMember(database.db, id, 'Crew', 'crew');
    await hideBoat(owner, id);
    await expect(openBoat(crew, id)).rejects.toBeInstanceOf(NotFoundError);
    expect(await listBoats(crew)).toMatchObject({ boats: [], hidden: [{ id }] });
    await expect(restoreBoat(crew, id)).rejects.toBeInstanceOf(NotAllowedError);
    await restoreBoat({ ...owner, now: later(29) }, id);
    expect((await openBoat(crew, id)).name).toBe('Test skiff');
  });

  it('does not bring a boat back after 30 days', async () => {
    const owner = await addPerson(database.db, 'Owner');
    const { id } = await createBoat(owner, 'Test skiff', aBoatSheet());
    await hideBoat(owner, id);
    const tooLate = { ...owner, now: later(31) };
    expect(await listBoats(tooLate)).toEqual({ boats: [], hidden: [] });
    await expect(restoreBoat(tooLate, id)).rejects.toBeInstanceOf(NotFoundError);
  });

  it('renames, and notes who did it', async () => {
    const owner = await addPerson(database.db, 'Owner');
    const { id } = await createBoat(owner, 'Test skiff', aBoatSheet());
    await renameBoat(owner, id, 'Other skiff');
    expect((await openBoat(owner, id)).name).toBe('Other skiff');
    const events = await database.db('audit_events').where({ subject_id: id }).orderBy('id');
    expect(events.map((event) => event.action)).toEqual(['create-boat', 'rename-boat']);
    expect(events[1]).toMatchObject({ user_id: owner.user.id, details: { from: 'Test skiff', to: 'Other skiff' } });
  });
});
