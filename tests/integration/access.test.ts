import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { NotAllowedError, NotFoundError } from '@/lib/errors';
import { createBoat } from '@/lib/usecases/boats/create-boat';
import { hideBoat } from '@/lib/usecases/boats/hide-boat';
import { listBoatSheets } from '@/lib/usecases/boats/list-boat-sheets';
import { openBoat } from '@/lib/usecases/boats/open-boat';
import { renameBoat } from '@/lib/usecases/boats/rename-boat';
import { restoreBoat } from '@/lib/usecases/boats/restore-boat';
import { saveBoatSheet } from '@/lib/usecases/boats/save-boat-sheet';
import type { Context } from '@/lib/usecases/context';
import { createPassage } from '@/lib/usecases/passages/create-passage';
import { hidePassage } from '@/lib/usecases/passages/hide-passage';
import { listPassageChecks } from '@/lib/usecases/passages/list-passage-checks';
import { openPassage } from '@/lib/usecases/passages/open-passage';
import { restorePassage } from '@/lib/usecases/passages/restore-passage';
import { savePassage } from '@/lib/usecases/passages/save-passage';
import { aBoatSheet } from '@/tests/builders/boat-sheet';
import { aPassagePlan } from '@/tests/builders/passage-plan';
import { addMember, addPerson } from '@/tests/builders/people';
import { createTestDatabase, type TestDatabase } from './helpers/database';

interface World {
  readonly owner: Context;
  readonly boatId: string;
  readonly passageId: string;
}
type Answer = 'yes' | 'not allowed' | 'not found';

/** Every use case of a boat or passage and what each role is told: docs of roles, as a test. */
const table: readonly [
  name: string,
  answers: { owner: Answer; skipper: Answer; crew: Answer; stranger: Answer },
  ask: (person: Context, world: World) => Promise<unknown>,
][] = [
  ['open the boat', read(), (person, { boatId }) => openBoat(person, boatId)],
  ['list the versions of the sheet', read(), (person, { boatId }) => listBoatSheets(person, boatId)],
  ['save a sheet', ownerOnly(), (person, { boatId }) => saveBoatSheet(person, boatId, aBoatSheet(), 1)],
  ['rename the boat', ownerOnly(), (person, { boatId }) => renameBoat(person, boatId, 'New name')],
  ['hide the boat', ownerOnly(), (person, { boatId }) => hideBoat(person, boatId)],
  [
    'bring the boat back',
    ownerOnly(),
    async (person, { owner, boatId }) => {
      await hideBoat(owner, boatId);
      await restoreBoat(person, boatId);
    },
  ],
  ['open the passage', read(), (person, { passageId }) => openPassage(person, passageId)],
  ['list the checks', read(), (person, { passageId }) => listPassageChecks(person, passageId)],
  ['make a passage', sailing(), (person, { boatId }) => createPassage(person, boatId, { name: 'Another' })],
  ['save the passage', sailing(), (person, { passageId }) => savePassage(person, passageId, aPassagePlan(), 1)],
  ['hide the passage', sailing(), (person, { passageId }) => hidePassage(person, passageId)],
  [
    'bring the passage back',
    sailing(),
    async (person, { owner, passageId }) => {
      await hidePassage(owner, passageId);
      await restorePassage(person, passageId);
    },
  ],
];

function read() {
  return { owner: 'yes', skipper: 'yes', crew: 'yes', stranger: 'not found' } as const;
}
function sailing() {
  return { owner: 'yes', skipper: 'yes', crew: 'not allowed', stranger: 'not found' } as const;
}
function ownerOnly() {
  return { owner: 'yes', skipper: 'not allowed', crew: 'not allowed', stranger: 'not found' } as const;
}

let database: TestDatabase;
beforeAll(async () => {
  database = await createTestDatabase();
});
afterAll(() => database.drop());

async function answerTo(question: Promise<unknown>): Promise<Answer> {
  try {
    await question;
    return 'yes';
  } catch (error) {
    if (error instanceof NotAllowedError) return 'not allowed';
    if (error instanceof NotFoundError) return 'not found';
    throw error;
  }
}

const rows = table.flatMap(([name, answers, ask]) =>
  (['owner', 'skipper', 'crew', 'stranger'] as const).map((role) => ({ name, role, answer: answers[role], ask })),
);

describe('roles', () => {
  it.each(rows)('$role, $name: $answer', async ({ role, answer, ask }) => {
    const owner = await addPerson(database.db, 'Owner');
    const { id: boatId } = await createBoat(owner, 'Test skiff', aBoatSheet());
    const { id: passageId } = await createPassage(owner, boatId, { name: 'Test passage' });
    const person =
      role === 'owner'
        ? owner
        : role === 'stranger'
          ? await addPerson(database.db, 'Stranger')
          : await addMember(database.db, boatId, 'Member', role);
    expect(await answerTo(ask(person, { owner, boatId, passageId }))).toBe(answer);
  });
});
