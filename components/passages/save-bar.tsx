'use client';

import { useEffect } from 'react';
import { Button, ButtonLink } from '@/components/ui/button';
import { SaveMessage } from './save-message';
import { SmallButton } from './small-button';
import type { Planner } from './use-planner';

/** Undo, redo and save, always in reach; what became of the last saving stands under it. */
export function SaveBar({ planner, passageId }: { readonly planner: Planner; readonly passageId: string }) {
  const { state, form, saving, unsaved, save, saveOver, triedToSave } = planner;
  const { dispatch } = form;
  useUndoKeys(
    () => dispatch({ type: 'undo' }),
    () => dispatch({ type: 'redo' }),
  );
  return (
    <div className="border-line bg-ground sticky top-0 z-20 -mx-4 mb-4 border-b px-4 py-2" data-testid="save-bar">
      <div className="flex flex-wrap items-center gap-2">
        <SmallButton label="Undo" disabled={state.past.length === 0} onClick={() => dispatch({ type: 'undo' })}>
          Undo
        </SmallButton>
        <SmallButton label="Redo" disabled={state.future.length === 0} onClick={() => dispatch({ type: 'redo' })}>
          Redo
        </SmallButton>
        <span className="text-muted ml-auto text-sm" role="status" data-testid="saved-state">
          {saving.busy ? 'Saving…' : unsaved ? 'Not saved yet' : 'Saved'}
        </span>
        <ButtonLink href={`/passages/${passageId}`} variant="plain">
          Stored check
        </ButtonLink>
        <Button onClick={save} disabled={saving.busy}>
          Save
        </Button>
      </div>
      {triedToSave && !form.reading.plan && (
        <p className="text-beyond mt-2 text-sm" role="alert">
          Not saved: some fields cannot be read yet. Each says what it needs; everything typed is kept.
        </p>
      )}
      <SaveMessage outcome={saving.outcome} passageId={passageId} busy={saving.busy} onSaveOver={saveOver} />
    </div>
  );
}

/** Ctrl or ⌘ with Z and Y. Inside a text field the browser's own undo keeps the keys. */
function useUndoKeys(undo: () => void, redo: () => void): void {
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
      if ((event.target as Element | null)?.closest?.('input, textarea, select')) return;
      const key = event.key.toLowerCase();
      if (key === 'z' && !event.shiftKey) undo();
      else if (key === 'y' || (key === 'z' && event.shiftKey)) redo();
      else return;
      event.preventDefault();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  });
}
