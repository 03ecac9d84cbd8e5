import type { Metadata } from 'next';
import { BoatForm } from '@/components/boats/boat-form';
import { newSheetForm } from '@/components/boats/new-sheet-form';
import { PageTitle } from '@/components/ui/page-title';
import { requireUser } from '@/lib/web/session';
import { saveBoat } from '../actions';

export const metadata: Metadata = { title: 'New boat' };

export default async function NewBoatPage() {
  await requireUser('/boats/new');
  return (
    <>
      <PageTitle title="New boat" aside="Common defaults are filled in; change each to your own." />
      <BoatForm initial={newSheetForm()} boatId={null} basedOnNumber={null} save={saveBoat} />
    </>
  );
}
