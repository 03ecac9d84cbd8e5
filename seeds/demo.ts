import type { Knex } from 'knex';
import { insertBoatMember } from '@/db/stores/boat-store';
import { findCredentialsByEmail, insertUser } from '@/db/stores/user-store';
import { loadLandIndex } from '@/lib/adapters/land-data';
import { env } from '@/lib/env';
import { boatSheetSchema } from '@/lib/schemas/boat-sheet';
import { passagePlanSchema } from '@/lib/schemas/passage-plan';
import { hashPassword } from '@/lib/usecases/accounts/password-hashing';
import { createBoat } from '@/lib/usecases/boats/create-boat';
import type { Context } from '@/lib/usecases/context';
import { createPassage } from '@/lib/usecases/passages/create-passage';
import { savePassage } from '@/lib/usecases/passages/save-passage';
import { demoBoatName, demoBoatSheet } from './demo/boat';
import { demoPassagePlan } from './demo/passage';
import { demoPassword, demoPeople } from './demo/people';
import { secondBoatName, secondBoatSheet } from './demo/second-boat';

/** Puts the demo's people, boats and passage in, once: where its owner exists, nothing is touched. */
export async function seed(knex: Knex): Promise<void> {
  if (!env().demoSeed) throw new Error('The demo is seeded only where it is asked for: set TWOBOW_DEMO=1.');
  const now = new Date();
  await knex.transaction(async (trx) => {
    await trx.raw('SELECT pg_advisory_xact_lock(7462693)');
    if (await findCredentialsByEmail(trx, demoPeople[0]!.email)) return;
    const [owner, ...others] = await Promise.all(
      demoPeople.map(async (person) => {
        const passwordHash = await hashPassword(demoPassword);
        const user = await insertUser(trx, { email: person.email, name: person.name, passwordHash });
        return { ...person, id: user!.id };
      }),
    );
    const context: Context = { db: trx, user: owner!, now };
    const boat = await createBoat(context, demoBoatName, boatSheetSchema.parse(demoBoatSheet));
    for (const person of others) await insertBoatMember(trx, boat.id, person.id, person.role);
    await createBoat(context, secondBoatName, boatSheetSchema.parse(secondBoatSheet));
    await seedPassage(context, boat.id);
  });
}

/** Saved as a skipper would save it, with the same check. */
async function seedPassage(context: Context, boatId: string): Promise<void> {
  const plan = passagePlanSchema.parse(demoPassagePlan(context.now));
  const { id } = await createPassage(context, boatId, { name: plan.name, zone: plan.zone });
  await savePassage({ ...context, land: await loadLandIndex() }, id, plan, 1);
}
