import { CAUTION } from '@/lib/passage-check/caution';

/** Stands with every verdict. */
export function Caution() {
  return (
    <p className="border-line text-muted border-t pt-2 text-sm" data-testid="caution">
      {CAUTION}
    </p>
  );
}
