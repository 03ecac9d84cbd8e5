import { countLiveTokens } from '@/db/read-models/tokens-of-user';
import { insertAuditEvent } from '@/db/stores/audit-store';
import { insertToken } from '@/db/stores/token-store';
import { InvalidInputError } from '@/lib/errors';
import type { Context } from '@/lib/usecases/context';
import { newSecretToken } from '@/lib/usecases/secret-token';

const MOST_TOKENS = 20;

export interface NewToken {
  readonly id: string;
  readonly name: string;
  /** Shown this once; only its hash is kept. */
  readonly token: string;
}

/** Makes a personal token for the API. It may do what its person may. */
export async function createToken({ db, user }: Context, name: string): Promise<NewToken> {
  if ((await countLiveTokens(db, user.id)) >= MOST_TOKENS) {
    const message = `You have ${MOST_TOKENS} tokens in use. Revoke one first.`;
    throw new InvalidInputError([{ pointer: '/name', message }], 422);
  }
  const { token, tokenHash } = newSecretToken('twobow_');
  return db.transaction(async (trx) => {
    const { id } = await insertToken(trx, { userId: user.id, name, tokenHash });
    await insertAuditEvent(trx, { userId: user.id, action: 'create-token', subjectId: id });
    return { id, name, token };
  });
}
