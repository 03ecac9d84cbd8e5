'use client';

import { useActionState } from 'react';
import { FormFrame } from '@/components/accounts/form-frame';
import { TextInput } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { emptyForm, type FormAction } from '@/lib/schemas/form-state';

export function NameForm({ action, name }: { readonly action: FormAction; readonly name: string }) {
  const [state, send, pending] = useActionState(action, emptyForm);
  return (
    <FormFrame action={send} pending={pending} problem={state.problem} submit="Save the name">
      <TextInput
        label="Name"
        name="name"
        autoComplete="name"
        key={name}
        defaultValue={state.values.name ?? name}
        problem={state.problems.name}
      />
      {state.done && (
        <Notice tone="good" live>
          The name is saved.
        </Notice>
      )}
    </FormFrame>
  );
}
