import { updateUserName } from '@/db/stores/user-store';
import type { Context } from '@/lib/usecases/context';

/** Changes the name by which the crew see the person. */
export async function renamePerson({ db, user }: Context, name: string): Promise<void> {
  await updateUserName(db, user.id, name);
}
