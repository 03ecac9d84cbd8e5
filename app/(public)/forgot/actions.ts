'use server';

import { resetRequestSchema } from '@/lib/schemas/account';
import type { FormState } from '@/lib/schemas/form-state';
import { requestPasswordReset } from '@/lib/usecases/accounts/request-password-reset';
import { answerForm } from '@/lib/web/answer-form';
import { visitorContext } from '@/lib/web/contexts';

export async function requestReset(_before: FormState, form: FormData): Promise<FormState> {
  return answerForm(form, resetRequestSchema, async ({ email }) => requestPasswordReset(await visitorContext(), email));
}
