import { insertAuditEvent } from '@/db/stores/audit-store';
import { forgetTries, giveBackTry } from '@/db/stores/throttle-store';
import { findCredentialsByEmail } from '@/db/stores/user-store';
import { verifyPassword } from '@/lib/usecases/accounts/password-hashing';
import { accountKey, throttle } from '@/lib/usecases/accounts/throttle';
import { throttleRules } from '@/lib/usecases/accounts/throttle-rules';
import type { VisitorContext } from '@/lib/usecases/context';

export interface SignedIn {
  readonly id: string;
  readonly email: string;
  readonly name: string;
  readonly sessionVersion: number;
}

/**
 * The person with this e-mail and password, else null, whichever of the two is wrong and in the same time.
 * Throws TooManyTriesError by account and by client address, whether or not the account exists.
 */
export async function signIn(
  context: Pick<VisitorContext, 'db' | 'address'>,
  { email, password }: { email: string; password: string },
): Promise<SignedIn | null> {
  await throttle(context.db, throttleRules.signInFromAddress, context.address);
  await throttle(context.db, throttleRules.signInOfAccount, accountKey(email));
  const found = await findCredentialsByEmail(context.db, email);
  const right = await verifyPassword(found?.passwordHash ?? null, password);
  await insertAuditEvent(context.db, { userId: found?.id ?? null, action: right ? 'sign-in' : 'fail-sign-in' });
  if (!found || !right) return null;
  await forgetTries(context.db, throttleRules.signInOfAccount, accountKey(email));
  await giveBackTry(context.db, throttleRules.signInFromAddress, context.address);
  return { id: found.id, email: found.email, name: found.name, sessionVersion: found.sessionVersion };
}
