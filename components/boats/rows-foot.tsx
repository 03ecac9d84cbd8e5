'use client';

import { Button } from '@/components/ui/button';
import { fieldId } from './list-problems';

interface RowsFootProps {
  readonly path: string;
  readonly addLabel: string;
  readonly said: string;
  readonly removed: { readonly name: string } | null;
  add(): void;
  putBack(): void;
}

/** Under a list of rows: add one, or put back what was taken out last. */
export function RowsFoot({ path, addLabel, said, removed, add, putBack }: RowsFootProps) {
  return (
    <div className="mt-4 flex flex-wrap items-center gap-3">
      <Button variant="plain" onClick={add}>
        {addLabel}
      </Button>
      {removed && (
        <Button id={fieldId(`${path}.back`)} variant="plain" onClick={putBack}>
          Put {removed.name} back
        </Button>
      )}
      <span role="status" className="sr-only">
        {said}
      </span>
    </div>
  );
}
