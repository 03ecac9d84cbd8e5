import type { Metadata } from 'next';
import { PassageReading } from '@/components/passages/passage-reading';
import { ButtonLink } from '@/components/ui/button';
import { PageTitle } from '@/components/ui/page-title';
import { PutAway } from '@/components/ui/put-away';
import { can } from '@/lib/access/can';
import { openBoat } from '@/lib/usecases/boats/open-boat';
import { openPassage } from '@/lib/usecases/passages/open-passage';
import { pageContext } from '@/lib/web/contexts';
import { orNotFound } from '@/lib/web/or-not-found';
import { putAway } from '../actions';

interface PageProps {
  readonly params: Promise<{ passageId: string }>;
}

export const metadata: Metadata = { title: 'Passage' };

export default async function PassagePage({ params }: PageProps) {
  const { passageId } = await params;
  const context = await pageContext(`/passages/${passageId}`);
  const { passage, latestCheck, boat, role } = await orNotFound(openPassage(context, passageId));
  // The check speaks of the version of the sheet it was made with, not of the newest.
  const pinned = latestCheck ? await orNotFound(openBoat(context, boat.id, latestCheck.sheetNumber)) : null;
  const mayWrite = can(role, 'write-passage');
  return (
    <>
      <PageTitle
        title={passage.name}
        actions={mayWrite && <ButtonLink href={`/passages/${passageId}/plan`}>Open the planner</ButtonLink>}
      />
      <PassageReading
        passage={passage}
        check={latestCheck && pinned ? { ...latestCheck, sheet: pinned.version.sheet } : null}
        boat={{ id: boat.id, name: boat.name, sheetNumber: boat.sheetNumber }}
        mayWrite={mayWrite}
        nowMs={context.now.getTime()}
      />
      {can(role, 'hide-passage') && (
        <div className="mt-8 print:hidden">
          <PutAway id={passageId} what="passage" name={passage.name} putAway={putAway}>
            {passage.name} goes out of sight, for the crew too. You can bring it back from the list of passages for 30
            days.
          </PutAway>
        </div>
      )}
    </>
  );
}
