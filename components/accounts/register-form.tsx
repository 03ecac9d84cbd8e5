'use client';

import { useActionState } from 'react';
import { FormFrame } from '@/components/accounts/form-frame';
import { ButtonLink } from '@/components/ui/button';
import { TextInput } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { emptyForm, type FormAction } from '@/lib/schemas/form-state';

export function RegisterForm({ action }: { readonly action: FormAction }) {
  const [state, send, pending] = useActionState(action, emptyForm);
  if (state.done) {
    return (
      <Notice tone="good" title="Registered" live>
        <p>A mail is on its way to that address. If it had no account, it has one now: sign in with your password.</p>
        <p className="mt-3">If it had one before, nothing was changed, and the mail says how to go on.</p>
        <p className="mt-4">
          <ButtonLink href="/sign-in">Sign in</ButtonLink>
        </p>
      </Notice>
    );
  }
  const { values, problems } = state;
  return (
    <FormFrame action={send} pending={pending} problem={state.problem} submit="Register">
      <TextInput
        label="Name"
        hint="The crew see it beside what you do."
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
      <TextInput
        label="Password"
        hint="At least 12 characters. A few words in a row are fine."
        name="password"
        type="password"
        autoComplete="new-password"
        problem={problems.password}
      />
    </FormFrame>
  );
}
