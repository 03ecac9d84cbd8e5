import type { Metadata } from 'next';
import { CrewPanel } from '@/components/boats/crew-panel';
import { PutAway } from '@/components/ui/put-away';
import { SheetReading } from '@/components/boats/sheet-reading';
import { VersionsPanel } from '@/components/boats/versions-panel';
import { ButtonLink } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { PageTitle } from '@/components/ui/page-title';
import { can } from '@/lib/access/can';
import { formatInZone } from '@/lib/time/format-in-zone';
import { listBoatSheets } from '@/lib/usecases/boats/list-boat-sheets';
import { openBoat } from '@/lib/usecases/boats/open-boat';
import { pageContext } from '@/lib/web/contexts';
import { orNotFound } from '@/lib/web/or-not-found';
import { putAway } from '../actions';

interface PageProps {
  readonly params: Promise<{ boatId: string }>;
  readonly searchParams: Promise<{ saved?: string | string[] }>;
}

export const metadata: Metadata = { title: 'Boat sheet' };

export default async function BoatPage({ params, searchParams }: PageProps) {
  const { boatId } = await params;
  const context = await pageContext(`/boats/${boatId}`);
  const { name, role, members, version } = await orNotFound(openBoat(context, boatId));
  const versions = await listBoatSheets(context, boatId);
  const savedAt = formatInZone(version.savedAt.getTime(), 'UTC', 'date-time');
  const edit = <ButtonLink href={`/boats/${boatId}/edit`}>Edit the boat sheet</ButtonLink>;
  return (
    <>
      <PageTitle
        title={name}
        aside={`Boat sheet ${version.number}, saved ${savedAt} by ${version.savedBy}`}
        actions={can(role, 'write-boat-sheet') && edit}
      />
      {(await searchParams).saved === String(version.number) && (
        <div className="mb-6">
          <Notice tone="good" live>
            Saved as boat sheet {version.number}.
          </Notice>
        </div>
      )}
      <SheetReading sheet={version.sheet}>
        <VersionsPanel boatId={boatId} versions={versions} shownNumber={version.number} />
        <CrewPanel members={members}>
          {can(role, 'hide-boat') && (
            <PutAway id={boatId} what="boat" name={name} putAway={putAway}>
              {name} and her passages go out of sight, for her crew too. You can bring her back from the list of boats
              for 30 days.
            </PutAway>
          )}
        </CrewPanel>
      </SheetReading>
    </>
  );
}
