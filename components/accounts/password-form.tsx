'use client';

import { useActionState } from 'react';
import { FormFrame } from '@/components/accounts/form-frame';
import { TextInput } from '@/components/ui/field';
import { emptyForm, type FormAction } from '@/lib/schemas/form-state';

/** Ends every session when it is through, so there is nothing to show after it but the sign-in page. */
export function PasswordForm({ action }: { readonly action: FormAction }) {
  const [state, send, pending] = useActionState(action, emptyForm);
  return (
    <FormFrame action={send} pending={pending} problem={state.problem} submit="Change the password">
      <TextInput
        label="Present password"
        name="currentPassword"
        type="password"
        autoComplete="current-password"
        problem={state.problems.currentPassword}
      />
      <TextInput
        label="New password"
        hint="At least 12 characters. It ends every session, this one too: sign in again with it."
        name="newPassword"
        type="password"
        autoComplete="new-password"
        problem={state.problems.newPassword}
      />
    </FormFrame>
  );
}
