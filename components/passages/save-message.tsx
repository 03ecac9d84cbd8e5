'use client';

import type { SaveOutcome } from './save-plan';
import { SmallButton } from './small-button';

interface SaveMessageProps {
  readonly outcome: SaveOutcome | null;
  readonly passageId: string;
  readonly busy: boolean;
  onSaveOver: () => void;
}

/** What became of the saving, where it did not work, and what can be done about it. */
export function SaveMessage({ outcome, passageId, busy, onSaveOver }: SaveMessageProps) {
  if (!outcome || outcome.kind === 'saved' || busy) return null;
  const link = 'underline underline-offset-4';
  return (
    <div className="border-beyond mt-2 border-l-4 pl-3 text-sm" role="alert" data-testid="save-message">
      {outcome.kind === 'conflict' && (
        <>
          <p>Not saved: {outcome.detail}</p>
          <p className="mt-1 flex flex-wrap items-center gap-3">
            <a className={link} href={`/passages/${passageId}`} target="_blank" rel="noreferrer">
              Look at the other version in a new window
            </a>
            <SmallButton onClick={onSaveOver}>Save mine over it</SmallButton>
          </p>
        </>
      )}
      {outcome.kind === 'signed-out' && (
        <p>
          Not saved: you are signed out. Everything typed is still here.{' '}
          <a className={link} href="/sign-in" target="_blank" rel="noreferrer">
            Sign in in a new window
          </a>{' '}
          and save again.
        </p>
      )}
      {outcome.kind === 'fields' && (
        <>
          <p>Not saved: the server refuses some values. Everything typed is kept.</p>
          <ul className="list-disc pl-5">
            {[...outcome.problems].map(([pointer, message]) => (
              <li key={pointer}>{message}</li>
            ))}
          </ul>
        </>
      )}
      {outcome.kind === 'failed' && <p>Not saved: {outcome.detail} Everything typed is kept.</p>}
    </div>
  );
}
