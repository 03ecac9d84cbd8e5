import Link from 'next/link';
import { ResetForm } from '@/components/accounts/reset-form';
import { PageTitle } from '@/components/ui/page-title';
import { setNewPassword } from './actions';

export const metadata = { title: 'New password', referrer: 'no-referrer' as const };

export default async function ResetPage({ params }: { readonly params: Promise<{ token: string }> }) {
  const { token } = await params;
  return (
    <>
      <PageTitle title="New password" aside="It ends every session of the account." />
      <ResetForm action={setNewPassword} token={token} />
      <p className="mt-6">
        <Link href="/forgot" className="underline">
          Ask for a new link
        </Link>
      </p>
    </>
  );
}
