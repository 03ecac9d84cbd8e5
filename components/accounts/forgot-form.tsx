'use client';

import { useActionState } from 'react';
import { FormFrame } from '@/components/accounts/form-frame';
import { TextInput } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { emptyForm, type FormAction } from '@/lib/schemas/form-state';

export function ForgotForm({ action }: { readonly action: FormAction }) {
  const [state, send, pending] = useActionState(action, emptyForm);
  if (state.done) {
    return (
      <Notice tone="good" title="Look into your mail" live>
        If that address has an account, a link is on its way to it. It works once and for an hour.
      </Notice>
    );
  }
  return (
    <FormFrame action={send} pending={pending} problem={state.problem} submit="Send a link">
      <TextInput
        label="E-mail"
        name="email"
        type="email"
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
        defaultValue={state.values.email ?? ''}
        problem={state.problems.email}
      />
    </FormFrame>
  );
}
