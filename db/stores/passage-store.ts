import type { Knex } from 'knex';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import { toJsonb } from '@/db/json';

export async function insertPassage(
  db: Knex,
  passage: { boatId: string; name: string; zone: string; departure: Date; createdBy: string },
): Promise<{ id: string }> {
  const [row] = await db('passages')
    .insert({
      boat_id: passage.boatId,
      name: passage.name,
      zone: passage.zone,
      departure: passage.departure,
      created_by: passage.createdBy,
    })
    .returning('id');
  return row!;
}

/** Holds the passage's row to the end of the transaction and tells its revision. */
export async function lockPassage(trx: Knex, passageId: string): Promise<{ revision: number }> {
  const row = await trx('passages').where({ id: passageId }).forUpdate().first('revision');
  return row!;
}

/** Writes all of the plan but its wind, as a new revision. */
export async function updatePassage(trx: Knex, passageId: string, revision: number, plan: PassagePlan): Promise<void> {
  await trx('passages')
    .where({ id: passageId })
    .update({
      name: plan.name,
      zone: plan.zone,
      departure: new Date(plan.departure),
      limits: toJsonb(plan.limits) as never,
      revision,
      updated_at: trx.fn.now() as unknown as Date,
    });
  await trx('waypoints').where({ passage_id: passageId }).delete();
  await trx('waypoints').insert(
    plan.route.map((waypoint, position) => ({
      passage_id: passageId,
      position,
      name: waypoint.name,
      lat: waypoint.lat,
      lon: waypoint.lon,
      corridor_half_width_m: waypoint.corridorHalfWidthM,
    })),
  );
  await trx('passage_streams').where({ passage_id: passageId }).delete();
  if (plan.streamRows.length > 0) {
    await trx('passage_streams').insert({ passage_id: passageId, rows: toJsonb(plan.streamRows) });
  }
}

export async function hidePassage(db: Knex, passageId: string, userId: string, now: Date): Promise<void> {
  await db('passages').where({ id: passageId }).update({ hidden_at: now, hidden_by: userId });
}

export async function showPassage(db: Knex, passageId: string): Promise<void> {
  await db('passages').where({ id: passageId }).update({ hidden_at: null, hidden_by: null });
}
