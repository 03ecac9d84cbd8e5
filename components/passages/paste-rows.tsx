'use client';

import { useId, useState } from 'react';
import type { Pasted } from './read-wind-paste';
import { SmallButton } from './small-button';

interface PasteRowsProps<Row> {
  readonly what: 'wind' | 'stream';
  readonly columns: string;
  readonly read: (text: string) => Pasted<Row>;
  onRows: (rows: readonly Row[], replace: boolean) => void;
}

/** Rows pasted from a sheet or a bulletin. What does not read is named by its line, and the text stays until all does. */
export function PasteRows<Row>({ what, columns, read, onRows }: PasteRowsProps<Row>) {
  const id = useId();
  const [text, setText] = useState('');
  const [problems, setProblems] = useState<readonly string[]>([]);
  const take = (replace: boolean) => {
    const pasted = read(text);
    const nothing = pasted.rows.length === 0 && pasted.problems.length === 0;
    setProblems(nothing ? [`Paste at least one line: ${columns}.`] : pasted.problems);
    if (nothing || pasted.problems.length > 0) return;
    onRows(pasted.rows, replace);
    setText('');
  };
  return (
    <details className="mt-3 text-sm">
      <summary className="decoration-line inline-flex min-h-9 cursor-pointer items-center underline underline-offset-4">
        Paste {what} rows
      </summary>
      <label htmlFor={id} className="text-muted mt-2 block">
        One line a row: {columns}; tabs or commas between
      </label>
      <textarea
        id={id}
        rows={4}
        value={text}
        onChange={(event) => setText(event.target.value)}
        aria-describedby={problems.length > 0 ? `${id}-problems` : undefined}
        aria-invalid={problems.length > 0 ? true : undefined}
        className="border-line bg-ground mt-1 w-full border p-2 tabular-nums"
        placeholder={what === 'wind' ? '2026-06-01 09:00, 240, 12, 17' : '2026-06-01 09:00, 320, 1.5'}
      />
      {problems.length > 0 && (
        <ul id={`${id}-problems`} className="text-beyond mt-1">
          {problems.map((problem) => (
            <li key={problem}>{problem}</li>
          ))}
        </ul>
      )}
      <div className="mt-2 flex flex-wrap gap-2">
        <SmallButton onClick={() => take(false)}>Add these rows</SmallButton>
        <SmallButton onClick={() => take(true)}>Put these in place of all {what} rows</SmallButton>
      </div>
    </details>
  );
}
