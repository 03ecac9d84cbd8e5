'use client';

import { useActionState } from 'react';
import { FormFrame } from '@/components/accounts/form-frame';
import { TextInput } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { emptyForm, type FormAction } from '@/lib/schemas/form-state';

export function RegisterForm({ action }: { readonly action: FormAction }) {
  const [state, send, pending] = useActionState(action, emptyForm);
  if (state.done) {
    return (
      <Notice tone="good" title="Look into your mail" live>
        <p>We have written to that address. Open the link in the mail within 24 hours and choose your password.</p>
        <p className="mt-3">
          If the address has an account already, nothing was changed, and the mail says how to go on.
        </p>
      </Notice>
    );
  }
  const { values, problems } = state;
  return (
    <FormFrame action={send} pending={pending} problem={state.problem} submit="Register">
      <TextInput
        label="Name"
        hint="The crew see it beside what you do. The password comes next, by a link in a mail."
        name="name"
        autoComplete="name"
        defaultValue={values.name ?? ''}
        problem={problems.name}
      />
      <TextInput
        label="E-mail"
        name="email"
        type="email"
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
        defaultValue={values.email ?? ''}
        problem={problems.email}
      />
    </FormFrame>
  );
}
