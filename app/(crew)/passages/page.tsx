import type { Metadata } from 'next';
import { PassageList } from '@/components/passages/passage-list';
import { ButtonLink } from '@/components/ui/button';
import { PageTitle } from '@/components/ui/page-title';
import { Caution } from '@/components/charts/caution';
import { listPassages } from '@/lib/usecases/passages/list-passages';
import { pageContext } from '@/lib/web/contexts';

export const metadata: Metadata = { title: 'Passages' };

export default async function PassagesPage() {
  const context = await pageContext('/passages');
  const { passages } = await listPassages(context);
  return (
    <>
      <PageTitle title="Passages" actions={<ButtonLink href="/passages/new">New passage</ButtonLink>} />
      <PassageList passages={passages} now={context.now} />
      <div className="mt-8">
        <Caution />
      </div>
    </>
  );
}
