import type { Metadata } from 'next';
import { BoatList } from '@/components/boats/boat-list';
import { ButtonLink } from '@/components/ui/button';
import { PageTitle } from '@/components/ui/page-title';
import { PutAwayList } from '@/components/ui/put-away-list';
import { can } from '@/lib/access/can';
import { listBoats } from '@/lib/usecases/boats/list-boats';
import { pageContext } from '@/lib/web/contexts';
import { bringBack } from './actions';

export const metadata: Metadata = { title: 'Boats' };

export default async function BoatsPage() {
  const { boats, hidden } = await listBoats(await pageContext('/boats'));
  return (
    <>
      <PageTitle title="Boats" actions={<ButtonLink href="/boats/new">New boat</ButtonLink>} />
      <BoatList boats={boats} />
      <PutAwayList items={hidden.filter(({ role }) => can(role, 'hide-boat'))} bringBack={bringBack} />
    </>
  );
}
