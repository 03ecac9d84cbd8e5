import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import type { SaveBoatAnswer } from './save-boat';

interface SaveNoticeProps {
  readonly answer: SaveBoatAnswer;
  readonly boatId: string | null;
  saveOver(newestNumber: number): void;
}

const LINK = 'text-spruce underline underline-offset-4';

/** Why it was not saved, where no single field is to blame. Everything typed stays on the page. */
export function SaveNotice({ answer, boatId, saveOver }: SaveNoticeProps) {
  if (answer.kind === 'refused') {
    return (
      <Notice tone="danger" title="Not saved" live>
        {answer.message} Everything typed is kept here.
      </Notice>
    );
  }
  if (answer.kind === 'signed-out') {
    return (
      <Notice tone="danger" title="Not saved: you are signed out" live>
        <a className={LINK} href="/sign-in" target="_blank" rel="noreferrer">
          Sign in on another page
        </a>
        , come back to this one and save again. Everything typed is kept here.
      </Notice>
    );
  }
  if (answer.kind !== 'conflict') return null;
  return (
    <Notice tone="danger" title="Not saved: there is a newer version" live>
      <p>{answer.message} Everything typed is kept here, and no version is ever lost.</p>
      <div className="mt-3 flex flex-wrap items-center gap-4">
        <a className={LINK} href={`/boats/${boatId}`} target="_blank" rel="noreferrer">
          Read boat sheet {answer.newestNumber}
        </a>
        <Button variant="plain" onClick={() => saveOver(answer.newestNumber)}>
          Save mine as boat sheet {answer.newestNumber + 1}
        </Button>
      </div>
    </Notice>
  );
}
