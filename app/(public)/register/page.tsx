import Link from 'next/link';
import { RegisterForm } from '@/components/accounts/register-form';
import { PageTitle } from '@/components/ui/page-title';
import { register } from './actions';

export const metadata = { title: 'Register' };

export default function RegisterPage() {
  return (
    <>
      <PageTitle title="Register" />
      <RegisterForm action={register} />
      <p className="mt-6">
        <Link href="/sign-in" className="underline">
          You have an account: sign in
        </Link>
      </p>
    </>
  );
}
