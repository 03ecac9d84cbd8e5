import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { BoatForm } from '@/components/boats/boat-form';
import { sheetToForm } from '@/components/boats/sheet-to-form';
import { PageTitle } from '@/components/ui/page-title';
import { can } from '@/lib/access/can';
import { openBoat } from '@/lib/usecases/boats/open-boat';
import { pageContext } from '@/lib/web/contexts';
import { orNotFound } from '@/lib/web/or-not-found';
import { saveBoat } from '../../actions';

interface PageProps {
  readonly params: Promise<{ boatId: string }>;
}

export const metadata: Metadata = { title: 'Edit the boat sheet' };

export default async function EditBoatPage({ params }: PageProps) {
  const { boatId } = await params;
  const context = await pageContext(`/boats/${boatId}/edit`);
  const { name, role, version } = await orNotFound(openBoat(context, boatId));
  if (!can(role, 'write-boat-sheet')) redirect(`/boats/${boatId}`);
  return (
    <>
      <PageTitle
        title={name}
        aside={`Based on boat sheet ${version.number}. Saving makes a new version; this one is kept.`}
      />
      <BoatForm
        initial={sheetToForm(name, version.sheet)}
        boatId={boatId}
        basedOnNumber={version.number}
        save={saveBoat}
      />
    </>
  );
}
