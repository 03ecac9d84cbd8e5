'use server';

import { registrationSchema } from '@/lib/schemas/account';
import type { FormState } from '@/lib/schemas/form-state';
import { registerAccount } from '@/lib/usecases/accounts/register-account';
import { answerForm } from '@/lib/web/answer-form';
import { visitorContext } from '@/lib/web/contexts';

export async function register(_before: FormState, form: FormData): Promise<FormState> {
  return answerForm(form, registrationSchema, async (account) => registerAccount(await visitorContext(), account));
}
