import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { Planner } from '@/components/passages/planner';
import { PageTitle } from '@/components/ui/page-title';
import { can } from '@/lib/access/can';
import { openPassage } from '@/lib/usecases/passages/open-passage';
import { pageContext } from '@/lib/web/contexts';
import { orNotFound } from '@/lib/web/or-not-found';

interface PageProps {
  readonly params: Promise<{ passageId: string }>;
}

export const metadata: Metadata = { title: 'Planner' };

export default async function PlannerPage({ params }: PageProps) {
  const { passageId } = await params;
  const context = await pageContext(`/passages/${passageId}/plan`);
  const { passage, boat, role } = await orNotFound(openPassage(context, passageId));
  if (!can(role, 'write-passage')) redirect(`/passages/${passageId}`);
  return (
    <>
      <PageTitle title={passage.name} />
      <Planner passage={passage} boat={{ name: boat.name, sheetNumber: boat.sheetNumber, sheet: boat.sheet }} />
    </>
  );
}
