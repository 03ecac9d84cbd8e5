'use client';

import { signIn } from 'next-auth/react';
import { type FormEvent, useState } from 'react';
import { Button } from '@/components/ui/button';
import { TextInput } from '@/components/ui/field';
import { Notice } from '@/components/ui/notice';
import { signInProblem } from '@/components/accounts/sign-in-problem';

/** Signs in with next-auth and goes on to `next`. The same words whichever of the two was wrong. */
export function SignInForm({ next }: { readonly next: string }) {
  const [problem, setProblem] = useState<string | null>(null);
  const [pending, setPending] = useState(false);

  async function submit(event: FormEvent<HTMLFormElement>) {
    event.preventDefault();
    const form = new FormData(event.currentTarget);
    setPending(true);
    setProblem(null);
    try {
      const credentials = { email: String(form.get('email')), password: String(form.get('password')) };
      const answer = await signIn('credentials', { ...credentials, redirect: false, callbackUrl: next });
      if (answer?.ok && !answer.error) {
        window.location.assign(next);
        return;
      }
      setProblem(signInProblem(answer?.error ?? null));
    } catch {
      setProblem('The server cannot be reached. Check the connection and try again.');
    }
    setPending(false);
  }

  return (
    <form method="post" onSubmit={(event) => void submit(event)} noValidate className="grid max-w-md gap-5">
      <TextInput
        label="E-mail"
        name="email"
        type="email"
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
      />
      <TextInput label="Password" name="password" type="password" autoComplete="current-password" />
      {problem && (
        <Notice tone="danger" live>
          {problem}
        </Notice>
      )}
      <div>
        <Button type="submit" disabled={pending}>
          Sign in
        </Button>
      </div>
    </form>
  );
}
