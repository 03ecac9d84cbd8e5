import Link from 'next/link';
import { ForgotForm } from '@/components/accounts/forgot-form';
import { PageTitle } from '@/components/ui/page-title';
import { requestReset } from './actions';

export const metadata = { title: 'Set a new password' };

export default function ForgotPage() {
  return (
    <>
      <PageTitle title="Set a new password" aside="A link to do it with is sent to your address." />
      <ForgotForm action={requestReset} />
      <p className="mt-6">
        <Link href="/sign-in" className="underline">
          Back to sign-in
        </Link>
      </p>
    </>
  );
}
