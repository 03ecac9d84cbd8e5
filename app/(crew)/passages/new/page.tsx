import type { Metadata } from 'next';
import { NewPassageForm } from '@/components/passages/new-passage-form';
import { PageTitle } from '@/components/ui/page-title';
import { can } from '@/lib/access/can';
import { listBoats } from '@/lib/usecases/boats/list-boats';
import { pageContext } from '@/lib/web/contexts';
import { makePassage } from './actions';

export const metadata: Metadata = { title: 'New passage' };

export default async function NewPassagePage() {
  const { boats } = await listBoats(await pageContext('/passages/new'));
  const choices = boats.filter((boat) => can(boat.role, 'write-passage')).map(({ id, name }) => ({ id, name }));
  return (
    <>
      <PageTitle title="New passage" />
      <NewPassageForm boats={choices} action={makePassage} />
    </>
  );
}
