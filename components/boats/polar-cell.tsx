'use client';

import { fieldId } from './list-problems';

interface PolarCellProps {
  readonly path: string;
  readonly label: string;
  readonly value: string;
  readonly wrong: boolean;
  readonly head?: boolean;
  onText(text: string): void;
}

/** One number of the polar's grid, kept as typed. */
export function PolarCell({ path, label, value, wrong, head, onText }: PolarCellProps) {
  return (
    <input
      id={fieldId(path)}
      aria-label={label}
      aria-invalid={wrong || undefined}
      inputMode="decimal"
      autoComplete="off"
      value={value}
      onChange={(event) => onText(event.target.value)}
      className={`border-line aria-invalid:border-beyond min-h-11 w-16 border px-2 text-right aria-invalid:border-2 ${head ? 'bg-panel font-bold' : 'bg-ground'}`}
    />
  );
}
