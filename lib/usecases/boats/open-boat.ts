import { listBoatMembers, type MemberLine } from '@/db/read-models/boat-members';
import { findBoatSheet, type SheetVersion } from '@/db/read-models/boat-sheets';
import type { BoatRole } from '@/lib/access/permissions';
import { NotFoundError } from '@/lib/errors';
import { requireBoat } from '@/lib/usecases/boats/require-boat';
import type { Context } from '@/lib/usecases/context';

export interface OpenedBoat {
  readonly id: string;
  readonly name: string;
  readonly role: BoatRole;
  readonly members: readonly MemberLine[];
  /** The version asked for. */
  readonly version: SheetVersion;
  /** The newest there is: base a new one on it. */
  readonly newestNumber: number;
}

/** A boat with one version of her sheet, the newest where no number is given. */
export async function openBoat(context: Context, boatId: string, sheetNumber?: number): Promise<OpenedBoat> {
  const access = await requireBoat(context, boatId, 'read-boat');
  const newest = await findBoatSheet(context.db, boatId);
  const wanted = sheetNumber === undefined ? newest : await findBoatSheet(context.db, boatId, sheetNumber);
  if (!newest || !wanted) throw new NotFoundError('That version of the boat sheet');
  const members = await listBoatMembers(context.db, boatId);
  return {
    id: boatId,
    name: access.boatName,
    role: access.role,
    members,
    version: wanted,
    newestNumber: newest.number,
  };
}
