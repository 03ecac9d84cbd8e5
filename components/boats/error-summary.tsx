'use client';

import type { Ref } from 'react';
import { fieldId, type Problem } from './list-problems';

interface ErrorSummaryProps {
  readonly problems: readonly Problem[];
  readonly ref?: Ref<HTMLDivElement>;
}

/** All messages at the top, each a link to its field. */
export function ErrorSummary({ problems, ref }: ErrorSummaryProps) {
  return (
    <div
      ref={ref}
      tabIndex={-1}
      role="alert"
      data-testid="error-summary"
      className="border-beyond bg-panel border border-l-4 px-4 py-3 outline-none"
    >
      <p className="font-bold">
        Not saved: {problems.length === 1 ? 'one field needs' : `${problems.length} fields need`} attention. Everything
        typed is kept.
      </p>
      <ul className="mt-1 max-h-72 overflow-y-auto">
        {problems.map(({ path, message }) => (
          <li key={`${path} ${message}`}>
            <a
              href={`#${fieldId(path)}`}
              onClick={(event) => {
                const field = fieldOrGroup(path);
                if (!field) return;
                event.preventDefault();
                field.focus();
                field.scrollIntoView({ block: 'center' });
              }}
              className="text-beyond inline-flex min-h-11 items-center underline underline-offset-4 md:min-h-8"
            >
              {message}
            </a>
          </li>
        ))}
      </ul>
    </div>
  );
}

/** The field itself, or the nearest group around it that is on the page. */
function fieldOrGroup(path: string): HTMLElement | null {
  const parts = path.split('.');
  for (let length = parts.length; length > 0; length -= 1) {
    const found = document.getElementById(fieldId(parts.slice(0, length).join('.')));
    if (found) return found;
  }
  return null;
}
