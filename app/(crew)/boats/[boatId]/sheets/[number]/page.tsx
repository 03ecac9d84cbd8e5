import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { SheetReading } from '@/components/boats/sheet-reading';
import { VersionsPanel } from '@/components/boats/versions-panel';
import { ButtonLink } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { PageTitle } from '@/components/ui/page-title';
import { formatInZone } from '@/lib/time/format-in-zone';
import { listBoatSheets } from '@/lib/usecases/boats/list-boat-sheets';
import { openBoat } from '@/lib/usecases/boats/open-boat';
import { pageContext } from '@/lib/web/contexts';
import { orNotFound } from '@/lib/web/or-not-found';

interface PageProps {
  readonly params: Promise<{ boatId: string; number: string }>;
}

export const metadata: Metadata = { title: 'A version of the boat sheet' };

export default async function BoatSheetPage({ params }: PageProps) {
  const { boatId, number } = await params;
  if (!/^[1-9]\d{0,5}$/.test(number)) notFound();
  const context = await pageContext(`/boats/${boatId}/sheets/${number}`);
  const { name, version, newestNumber } = await orNotFound(openBoat(context, boatId, Number(number)));
  const versions = await listBoatSheets(context, boatId);
  const savedAt = formatInZone(version.savedAt.getTime(), 'UTC', 'date-time');
  return (
    <>
      <PageTitle
        title={name}
        aside={`Boat sheet ${version.number}, saved ${savedAt} by ${version.savedBy}`}
        actions={<ButtonLink href={`/boats/${boatId}`}>Open the newest</ButtonLink>}
      />
      {version.number !== newestNumber && (
        <div className="mb-6">
          <Notice tone="caution" title="An older version">
            This is boat sheet {version.number}; the newest is {newestNumber}. It is kept as it was, for the checks that
            were made with it.
          </Notice>
        </div>
      )}
      <SheetReading sheet={version.sheet}>
        <VersionsPanel boatId={boatId} versions={versions} shownNumber={version.number} />
      </SheetReading>
    </>
  );
}
