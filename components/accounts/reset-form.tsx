'use client';

import { useActionState } from 'react';
import { FormFrame } from '@/components/accounts/form-frame';
import { TextInput } from '@/components/ui/field';
import { emptyForm, type FormAction } from '@/lib/schemas/form-state';

interface ResetFormProps {
  readonly action: FormAction;
  readonly token: string;
}

export function ResetForm({ action, token }: ResetFormProps) {
  const [state, send, pending] = useActionState(action, emptyForm);
  return (
    <FormFrame action={send} pending={pending} problem={state.problem} submit="Set the password">
      <input type="hidden" name="token" value={token} />
      <TextInput
        label="New password"
        hint="At least 12 characters. A few words in a row are fine."
        name="password"
        type="password"
        autoComplete="new-password"
        problem={state.problems.password}
      />
    </FormFrame>
  );
}
