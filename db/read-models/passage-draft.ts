import type { Knex } from 'knex';
import type { PassagePlan } from '@/lib/schemas/passage-plan';

/**
 * A passage as the planner opens it. Of one that was never saved the route and the wind's rows are empty,
 * and the wind's source and issue time are empty texts.
 */
export interface PassageDraft extends PassagePlan {
  readonly id: string;
  readonly boatId: string;
  readonly revision: number;
}

export async function findPassageDraft(db: Knex, passageId: string): Promise<PassageDraft | null> {
  const passage = await db('passages').where({ id: passageId }).first();
  if (!passage) return null;
  const waypoints = await db('waypoints').where({ passage_id: passageId }).orderBy('position');
  const forecast = await db('forecasts').where({ passage_id: passageId }).orderBy('number', 'desc').first();
  const stream = await db('passage_streams').where({ passage_id: passageId }).first();
  return {
    id: passage.id,
    boatId: passage.boat_id,
    revision: passage.revision,
    name: passage.name,
    zone: passage.zone,
    departure: passage.departure.toISOString(),
    limits: passage.limits as PassagePlan['limits'],
    route: waypoints.map((waypoint) => ({
      name: waypoint.name,
      lat: waypoint.lat,
      lon: waypoint.lon,
      corridorHalfWidthM: waypoint.corridor_half_width_m,
    })),
    wind: forecast
      ? { source: forecast.source, issuedAt: forecast.issued_at.toISOString(), rows: forecast.rows }
      : { source: '', issuedAt: '', rows: [] },
    streamRows: stream?.rows ?? [],
  };
}
