import { NameForm } from '@/components/accounts/name-form';
import { PasswordForm } from '@/components/accounts/password-form';
import { SignOutButton } from '@/components/accounts/sign-out-button';
import { TokenForm } from '@/components/accounts/token-form';
import { TokenList } from '@/components/accounts/token-list';
import { Button } from '@/components/ui/button';
import { PageTitle } from '@/components/ui/page-title';
import { Panel } from '@/components/ui/panel';
import { listTokens } from '@/lib/usecases/tokens/list-tokens';
import { pageContext } from '@/lib/web/contexts';
import { endSessions, makeToken, revoke, saveName, savePassword } from './actions';

export const metadata = { title: 'Account' };

export default async function AccountPage() {
  const context = await pageContext('/account');
  const tokens = await listTokens(context);
  return (
    <>
      <PageTitle title="Account" aside={context.user.email} actions={<SignOutButton />} />
      <div className="grid gap-6 lg:grid-cols-2">
        <Panel title="Name">
          <NameForm action={saveName} name={context.user.name} />
        </Panel>
        <Panel title="Password">
          <PasswordForm action={savePassword} />
        </Panel>
        <Panel title="Personal tokens" className="lg:col-span-2">
          <p className="mb-5">For programs of yours that ask for checks. A token may do what you may.</p>
          <div className="grid gap-6">
            <TokenForm action={makeToken} />
            <TokenList tokens={tokens} revoke={revoke} />
          </div>
        </Panel>
        <Panel title="Sign out everywhere" className="lg:col-span-2">
          <p className="mb-4">Ends every session on every device, this one too. Tokens stay until you revoke them.</p>
          <form action={endSessions}>
            <Button type="submit" variant="danger">
              Sign out everywhere
            </Button>
          </form>
        </Panel>
      </div>
    </>
  );
}
