'use server';

import { redirect } from 'next/navigation';
import { newPasswordSchema } from '@/lib/schemas/account';
import type { FormState } from '@/lib/schemas/form-state';
import { resetPassword } from '@/lib/usecases/accounts/reset-password';
import { answerForm } from '@/lib/web/answer-form';
import { visitorContext } from '@/lib/web/contexts';

export async function setNewPassword(_before: FormState, form: FormData): Promise<FormState> {
  return answerForm(form, newPasswordSchema, async (reset) => {
    await resetPassword(await visitorContext(), reset);
    redirect('/sign-in?done=password');
  });
}
