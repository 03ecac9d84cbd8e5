import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { InvalidInputError, TooManyTriesError } from '@/lib/errors';
import { changePassword } from '@/lib/usecases/accounts/change-password';
import { openSession } from '@/lib/usecases/accounts/open-session';
import { registerAccount } from '@/lib/usecases/accounts/register-account';
import { requestPasswordReset } from '@/lib/usecases/accounts/request-password-reset';
import { resetPassword } from '@/lib/usecases/accounts/reset-password';
import { signIn } from '@/lib/usecases/accounts/sign-in';
import { signOutEverywhere } from '@/lib/usecases/accounts/sign-out-everywhere';
import { testNow } from '@/tests/builders/people';
import { aVisitor } from '@/tests/builders/visitor';
import { createTestDatabase, type TestDatabase } from './helpers/database';

let database: TestDatabase;
beforeAll(async () => {
  database = await createTestDatabase();
});
afterAll(() => database.drop());

const password = 'a quiet anchorage';
const anEmail = () => `visitor-${randomUUID()}@example.org`;

/** The token of the newest link in somebody's mail. */
function tokenIn(mails: readonly { readonly text: string }[]): string {
  return /\/reset\/(\S+)/.exec(mails[mails.length - 1]!.text)![1]!;
}

/** Registered, and the password chosen by the mailed link. Four more mails may go to the address this hour. */
async function registered() {
  const visitor = aVisitor(database.db);
  const email = anEmail();
  await registerAccount(visitor, { email, name: 'Visitor' });
  await resetPassword(visitor, { token: tokenIn(visitor.sent), password });
  return { visitor, email };
}

describe('registering', () => {
  it('makes an account that can sign in, in any case of letters, once its password is chosen by mail', async () => {
    const visitor = aVisitor(database.db);
    const email = anEmail();
    await registerAccount(visitor, { email, name: 'Visitor' });
    expect(visitor.sent).toMatchObject([{ to: email, subject: 'Your Twobow account' }]);
    expect(await signIn(visitor, { email, password })).toBeNull();
    await resetPassword(visitor, { token: tokenIn(visitor.sent), password });
    expect(await signIn(visitor, { email: email.toUpperCase(), password })).toMatchObject({ email, name: 'Visitor' });
    const row = await database.db('users').where({ email }).first();
    expect(row!.password_hash).toMatch(/^\$argon2id\$v=19\$m=65536,t=3,p=1\$/);
  });

  it('with an e-mail that exists answers the same, changes nothing and tells its holder', async () => {
    const { email } = await registered();
    const somebody = aVisitor(database.db);
    const answer = await registerAccount(somebody, { email, name: 'Thief' });
    expect(answer).toBeUndefined();
    expect(await signIn(somebody, { email, password })).toMatchObject({ name: 'Visitor' });
    expect(somebody.sent).toHaveLength(1);
    expect(somebody.sent[0]).toMatchObject({ to: email, subject: 'Your Twobow account' });
    expect(somebody.sent[0]!.text).toContain('has an account already');
    expect(somebody.sent[0]!.text).not.toContain('/reset/');
  });

  it('again before the password is chosen sends a new link, and the old one is dead', async () => {
    const visitor = aVisitor(database.db);
    const email = anEmail();
    await registerAccount(visitor, { email, name: 'Visitor' });
    const first = tokenIn(visitor.sent);
    await registerAccount(visitor, { email, name: 'Visitor' });
    const again = resetPassword(visitor, { token: first, password });
    await expect(again).rejects.toMatchObject({ status: 422, fields: [{ pointer: '/token' }] });
    await resetPassword(visitor, { token: tokenIn(visitor.sent), password });
    expect(await signIn(visitor, { email, password })).not.toBeNull();
  });

  it('leaves a link that is dead after a day', async () => {
    const visitor = aVisitor(database.db);
    await registerAccount(visitor, { email: anEmail(), name: 'Visitor' });
    const later = { ...visitor, now: new Date(visitor.now.getTime() + 24 * 3_600_000 + 1) };
    const late = resetPassword(later, { token: tokenIn(visitor.sent), password });
    await expect(late).rejects.toMatchObject({ status: 422, fields: [{ pointer: '/token' }] });
  });

  it('refuses a first password that is short or the e-mail itself', async () => {
    const visitor = aVisitor(database.db);
    const email = anEmail();
    await registerAccount(visitor, { email, name: 'Visitor' });
    for (const bad of ['eleven char', email, email.toUpperCase()]) {
      const attempt = resetPassword(visitor, { token: tokenIn(visitor.sent), password: bad });
      await expect(attempt).rejects.toMatchObject({ status: 422, fields: [{ pointer: '/password' }] });
    }
    expect(await signIn(visitor, { email, password: 'eleven char' })).toBeNull();
  });
});

describe('signing in', () => {
  it('says the same of an unknown e-mail and a wrong password, in like time', async () => {
    const { visitor, email } = await registered();
    const timeOf = async (attempt: { email: string; password: string }) => {
      const start = performance.now();
      expect(await signIn(visitor, attempt)).toBeNull();
      return performance.now() - start;
    };
    const wrong: number[] = [];
    const unknown: number[] = [];
    for (let i = 0; i < 5; i += 1) {
      wrong.push(await timeOf({ email, password: 'not the password' }));
      unknown.push(await timeOf({ email: anEmail(), password: 'not the password' }));
    }
    const ratio = Math.min(...unknown) / Math.min(...wrong);
    expect(ratio).toBeGreaterThan(0.5);
    expect(ratio).toBeLessThan(2);
  });

  it.each(['an account that exists', 'one that does not'])(
    'is throttled by %s, and the right password too',
    async (which) => {
      const email = which.includes('not') ? anEmail() : (await registered()).email;
      for (let i = 0; i < 10; i += 1) {
        expect(await signIn(aVisitor(database.db), { email, password: 'guess after guess' })).toBeNull();
      }
      const eleventh = signIn(aVisitor(database.db), { email, password });
      await expect(eleventh).rejects.toBeInstanceOf(TooManyTriesError);
      await expect(signIn(aVisitor(database.db), { email: anEmail(), password })).resolves.toBeNull();
    },
  );

  it('is throttled by address over many accounts; signing in rightly is not counted', async () => {
    const { email } = await registered();
    const visitor = aVisitor(database.db);
    await signIn(visitor, { email, password });
    await database
      .db('throttle_points')
      .where({ key: `sign-in-address:${visitor.address}` })
      .update({ points: 59 } as never);
    expect(await signIn(visitor, { email, password })).not.toBeNull();
    expect(await signIn(visitor, { email: anEmail(), password })).toBeNull();
    await expect(signIn(visitor, { email, password })).rejects.toBeInstanceOf(TooManyTriesError);
  });
});

describe('sessions', () => {
  async function session() {
    const { visitor, email } = await registered();
    const signedIn = (await signIn(visitor, { email, password }))!;
    const isOpen = async () => (await openSession(database.db, signedIn.id, signedIn.sessionVersion)) !== null;
    return { visitor, email, isOpen, context: { ...visitor, user: signedIn } };
  }

  it('end with “sign out everywhere”', async () => {
    const { isOpen, context } = await session();
    expect(await isOpen()).toBe(true);
    await signOutEverywhere(context);
    expect(await isOpen()).toBe(false);
  });

  it('end with a change of password, which asks for the present one', async () => {
    const { visitor, email, isOpen, context } = await session();
    const wrong = changePassword(context, { currentPassword: 'not the password', newPassword: 'a brand new password' });
    await expect(wrong).rejects.toMatchObject({ fields: [{ pointer: '/currentPassword' }] });
    expect(await isOpen()).toBe(true);
    await changePassword(context, { currentPassword: password, newPassword: 'a brand new password' });
    expect(await isOpen()).toBe(false);
    expect(await signIn(visitor, { email, password })).toBeNull();
    expect(await signIn(visitor, { email, password: 'a brand new password' })).not.toBeNull();
    expect(visitor.sent.at(-1)).toMatchObject({ to: email, subject: 'Your Twobow password was changed' });
  });

  it('do not open with an id that is none', async () => {
    expect(await openSession(database.db, 'undefined', 1)).toBeNull();
  });
});

describe('a forgotten password', () => {
  async function asked() {
    const { visitor, email } = await registered();
    const before = (await signIn(visitor, { email, password }))!;
    await requestPasswordReset(visitor, email);
    return { visitor, email, before, token: tokenIn(visitor.sent) };
  }
  const fresh = 'the wind came round';

  it('is set anew by a mailed link, once, and every session ends', async () => {
    const { visitor, email, before, token } = await asked();
    await resetPassword(visitor, { token, password: fresh });
    expect(await signIn(visitor, { email, password: fresh })).not.toBeNull();
    expect(await signIn(visitor, { email, password })).toBeNull();
    expect(await openSession(database.db, before.id, before.sessionVersion)).toBeNull();
    const again = resetPassword(visitor, { token, password: 'yet another password' });
    await expect(again).rejects.toMatchObject({ fields: [{ pointer: '/token' }] });
    expect(await signIn(visitor, { email, password: fresh })).not.toBeNull();
  });

  it('keeps the link when the new password is refused', async () => {
    const { visitor, email, token } = await asked();
    await expect(resetPassword(visitor, { token, password: email })).rejects.toMatchObject({
      fields: [{ pointer: '/password' }],
    });
    await resetPassword(visitor, { token, password: fresh });
  });

  it('has a link that dies after an hour, or when a newer one is asked for', async () => {
    const { visitor, email, token } = await asked();
    const late = { ...visitor, now: new Date(testNow.getTime() + 61 * 60_000) };
    await expect(resetPassword(late, { token, password: fresh })).rejects.toBeInstanceOf(InvalidInputError);
    await requestPasswordReset(visitor, email);
    await expect(resetPassword(visitor, { token, password: fresh })).rejects.toBeInstanceOf(InvalidInputError);
  });

  it('stores the link hashed', async () => {
    const { token } = await asked();
    const { rows } = await database.db.raw<{ rows: { text: string }[] }>(
      'SELECT password_resets::text AS text FROM password_resets',
    );
    expect(rows.some((row) => row.text.includes(token))).toBe(false);
  });

  it('says nothing and sends nothing where nobody has the address', async () => {
    const visitor = aVisitor(database.db);
    expect(await requestPasswordReset(visitor, anEmail())).toBeUndefined();
    expect(visitor.sent).toEqual([]);
  });

  it('is throttled by account alike whether it exists', async () => {
    const { email } = await registered(); // its first link is the first of five mails an hour
    const nobody = anEmail();
    for (let i = 0; i < 4; i += 1) await requestPasswordReset(aVisitor(database.db), email);
    for (let i = 0; i < 5; i += 1) await requestPasswordReset(aVisitor(database.db), nobody);
    for (const one of [email, nobody]) {
      await expect(requestPasswordReset(aVisitor(database.db), one)).rejects.toBeInstanceOf(TooManyTriesError);
    }
  });
});
