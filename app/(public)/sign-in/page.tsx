import Link from 'next/link';
import { redirect } from 'next/navigation';
import { SignInForm } from '@/components/accounts/sign-in-form';
import { signInProblem } from '@/components/accounts/sign-in-problem';
import { Notice } from '@/components/ui/notice';
import { PageTitle } from '@/components/ui/page-title';
import { returnPath } from '@/lib/web/return-path';
import { sessionUser } from '@/lib/web/session';

export const metadata = { title: 'Sign in' };

const doneWords: Readonly<Record<string, string>> = {
  password: 'The password is changed and every session was ended. Sign in with the new one.',
  everywhere: 'You are signed out on every device.',
};

interface Props {
  readonly searchParams: Promise<{ next?: string | string[]; done?: string | string[]; error?: string | string[] }>;
}

export default async function SignInPage({ searchParams }: Props) {
  const { next, done, error } = await searchParams;
  const goOn = returnPath(typeof next === 'string' ? next : undefined);
  if (await sessionUser()) redirect(goOn);
  const doneText = typeof done === 'string' ? doneWords[done] : undefined;
  return (
    <>
      <PageTitle title="Sign in" />
      <div className="grid gap-6">
        {doneText && <Notice tone="good">{doneText}</Notice>}
        {typeof error === 'string' && <Notice tone="danger">{signInProblem(error)}</Notice>}
        <SignInForm next={goOn} />
        <p>
          <Link href="/forgot" className="underline">
            Set a new password
          </Link>{' '}
          ·{' '}
          <Link href="/register" className="underline">
            Register
          </Link>
        </p>
      </div>
    </>
  );
}
