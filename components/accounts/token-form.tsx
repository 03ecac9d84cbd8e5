'use client';

import { useActionState } from 'react';
import { FormFrame } from '@/components/accounts/form-frame';
import { TextInput } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { emptyForm, type FormAction } from '@/lib/schemas/form-state';

export function TokenForm({ action }: { readonly action: FormAction }) {
  const [state, send, pending] = useActionState(action, emptyForm);
  return (
    <div className="grid gap-5">
      <FormFrame action={send} pending={pending} problem={state.problem} submit="Make a token">
        <TextInput
          label="Name of the token"
          hint="What it is for: the next person to revoke one will want to know."
          name="name"
          autoComplete="off"
          defaultValue={state.values.name ?? ''}
          problem={state.problems.name}
        />
      </FormFrame>
      {state.secret && (
        <Notice tone="good" title="Copy it now: it is shown this once" live>
          <code className="block py-2 break-all select-all" data-testid="new-token">
            {state.secret}
          </code>
          Send it as “Authorization: Bearer …”. It may do what you may.
        </Notice>
      )}
    </div>
  );
}
