import type { Knex } from 'knex';
import type { BoatRole } from '@/lib/access/permissions';
import type { CheckState } from '@/lib/passages/passage';

export interface PassageLine {
  readonly id: string;
  readonly name: string;
  readonly boatId: string;
  readonly boatName: string;
  readonly role: BoatRole;
  readonly zone: string;
  readonly departure: Date;
  readonly updatedAt: Date;
  readonly hiddenAt: Date | null;
  /** Of the newest stored check; null where none was made yet. */
  readonly state: CheckState | null;
  readonly largestLoadShare: number | null;
  readonly worstLeg: { readonly position: number; readonly from: string; readonly to: string } | null;
  /** Of the forecast that check was made with: an old one no longer carries its state. */
  readonly forecastIssuedAt: Date | null;
}

interface Filter {
  readonly boatId?: string;
  readonly which: { readonly hidden: false } | { readonly hidden: true; readonly since: Date };
}

/** The passages of all boats the person has a role on, next departures first. */
export async function listPassagesOfUser(
  db: Knex,
  userId: string,
  { boatId, which }: Filter,
): Promise<readonly PassageLine[]> {
  const query = db('passages')
    .join('boats', 'boats.id', 'passages.boat_id')
    .join('boat_members', 'boat_members.boat_id', 'boats.id')
    .joinRaw(
      `LEFT JOIN LATERAL (SELECT state, largest_load_share, worst_leg_position,
           result #>> ARRAY['legs', worst_leg_position::text, 'from'] AS worst_from,
           result #>> ARRAY['legs', worst_leg_position::text, 'to'] AS worst_to,
           (SELECT issued_at FROM forecasts WHERE forecasts.id = passage_checks.forecast_id) AS issued_at
         FROM passage_checks WHERE passage_id = passages.id
         ORDER BY passage_revision DESC, created_at DESC LIMIT 1) newest ON true`,
    )
    .where('boat_members.user_id', userId)
    .whereNull('boats.hidden_at')
    .orderBy('passages.departure', 'desc')
    .select(
      'passages.*',
      'boats.name as boat_name',
      'boat_members.role',
      'newest.state',
      'newest.largest_load_share',
      'newest.worst_leg_position',
      'newest.worst_from',
      'newest.worst_to',
      'newest.issued_at as forecast_issued_at',
    );
  if (boatId !== undefined) query.where('passages.boat_id', boatId);
  if (which.hidden) query.where('passages.hidden_at', '>', which.since);
  else query.whereNull('passages.hidden_at');
  const rows = await query;
  return rows.map((row) => ({
    id: row.id,
    name: row.name,
    boatId: row.boat_id,
    boatName: row.boat_name,
    role: row.role,
    zone: row.zone,
    departure: row.departure,
    updatedAt: row.updated_at,
    hiddenAt: row.hidden_at,
    state: row.state,
    largestLoadShare: row.largest_load_share,
    worstLeg:
      row.worst_leg_position === null
        ? null
        : { position: row.worst_leg_position, from: row.worst_from, to: row.worst_to },
    forecastIssuedAt: row.forecast_issued_at,
  }));
}
