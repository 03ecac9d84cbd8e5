import type { Knex } from 'knex';
import type { BoatRole } from '@/lib/access/permissions';

export interface MemberLine {
  readonly name: string;
  readonly role: BoatRole;
}

/** Who sails her, owners first. */
export async function listBoatMembers(db: Knex, boatId: string): Promise<readonly MemberLine[]> {
  return db('boat_members')
    .join('users', 'users.id', 'boat_members.user_id')
    .where('boat_members.boat_id', boatId)
    .orderByRaw(`array_position(ARRAY['owner','skipper','crew'], boat_members.role), users.name`)
    .select('users.name', 'boat_members.role');
}
