import type { Metadata } from 'next';
import { PassageList } from '@/components/passages/passage-list';
import { ButtonLink } from '@/components/ui/button';
import { PageTitle } from '@/components/ui/page-title';
import { PutAwayList } from '@/components/ui/put-away-list';
import { can } from '@/lib/access/can';
import { Caution } from '@/components/charts/caution';
import { listPassages } from '@/lib/usecases/passages/list-passages';
import { pageContext } from '@/lib/web/contexts';
import { bringBack } from './actions';

export const metadata: Metadata = { title: 'Passages' };

export default async function PassagesPage() {
  const context = await pageContext('/passages');
  const { passages, hidden } = await listPassages(context);
  return (
    <>
      <PageTitle title="Passages" actions={<ButtonLink href="/passages/new">New passage</ButtonLink>} />
      <PassageList passages={passages} now={context.now} />
      <PutAwayList items={hidden.filter(({ role }) => can(role, 'hide-passage'))} bringBack={bringBack} />
      <div className="mt-8">
        <Caution />
      </div>
    </>
  );
}
