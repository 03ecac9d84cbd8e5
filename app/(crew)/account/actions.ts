'use server';

import { revalidatePath } from 'next/cache';
import { redirect } from 'next/navigation';
import { NotFoundError } from '@/lib/errors';
import { passwordChangeSchema, personNameSchema, tokenNameSchema } from '@/lib/schemas/account';
import type { FormState } from '@/lib/schemas/form-state';
import { changePassword } from '@/lib/usecases/accounts/change-password';
import { renamePerson } from '@/lib/usecases/accounts/rename-person';
import { signOutEverywhere } from '@/lib/usecases/accounts/sign-out-everywhere';
import { createToken } from '@/lib/usecases/tokens/create-token';
import { revokeToken } from '@/lib/usecases/tokens/revoke-token';
import { answerForm } from '@/lib/web/answer-form';
import { mailingContext, pageContext } from '@/lib/web/contexts';

export async function saveName(_before: FormState, form: FormData): Promise<FormState> {
  const context = await pageContext('/account');
  return answerForm(form, personNameSchema, async ({ name }) => {
    await renamePerson(context, name);
    revalidatePath('/account');
  });
}

export async function savePassword(_before: FormState, form: FormData): Promise<FormState> {
  const context = await mailingContext('/account');
  return answerForm(form, passwordChangeSchema, async (passwords) => {
    await changePassword(context, passwords);
    redirect('/sign-in?done=password');
  });
}

export async function makeToken(_before: FormState, form: FormData): Promise<FormState> {
  const context = await pageContext('/account');
  return answerForm(form, tokenNameSchema, async ({ name }) => {
    const { token } = await createToken(context, name);
    revalidatePath('/account');
    return { secret: token };
  });
}

/** A token that is gone already is as revoked as it can be: the list shows it. */
export async function revoke(form: FormData): Promise<void> {
  const context = await pageContext('/account');
  try {
    await revokeToken(context, String(form.get('tokenId')));
  } catch (error) {
    if (!(error instanceof NotFoundError)) throw error;
  }
  revalidatePath('/account');
}

export async function endSessions(): Promise<void> {
  await signOutEverywhere(await pageContext('/account'));
  redirect('/sign-in?done=everywhere');
}
