import { notFound } from 'next/navigation';
import { KeptMail } from '@/components/accounts/kept-mail';
import { PageTitle } from '@/components/ui/page-title';
import { keptMails } from '@/lib/web/mailbox';

export const metadata = { title: 'Mails kept here' };
export const dynamic = 'force-dynamic';

/** Exists only where mail is kept instead of sent: in development, the demo and tests. */
export default async function KeptMailsPage() {
  const mails = await keptMails();
  if (!mails) notFound();
  return (
    <main id="content" tabIndex={-1} className="mx-auto max-w-3xl px-4 py-8 outline-none">
      <PageTitle title="Mails kept here" aside="This server sends none. Everybody who can open it can read them." />
      {mails.length === 0 && <p>No mail yet. Register, or ask for a new password.</p>}
      <div className="grid gap-5">
        {mails.map((mail, index) => (
          <KeptMail key={mails.length - index} mail={mail} />
        ))}
      </div>
    </main>
  );
}
