import { listTokensOfUser, type TokenLine } from '@/db/read-models/tokens-of-user';
import type { Context } from '@/lib/usecases/context';

/** The person's tokens, newest first, without the secret, which nobody has. */
export async function listTokens({ db, user }: Context): Promise<readonly TokenLine[]> {
  return listTokensOfUser(db, user.id);
}
