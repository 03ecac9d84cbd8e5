'use client';

import { useState } from 'react';

export type Theme = 'day' | 'night';

const YEAR_S = 31_536_000;

/** Day or night. The choice is kept in a cookie, so that the server draws the page in it from the start. */
export function ThemeSwitch({ initial }: { readonly initial: Theme }) {
  const [theme, setTheme] = useState<Theme>(initial);
  const other: Theme = theme === 'day' ? 'night' : 'day';
  const change = () => {
    document.documentElement.dataset.theme = other;
    document.cookie = `theme=${other}; path=/; max-age=${YEAR_S}; samesite=lax`;
    setTheme(other);
  };
  return (
    <button
      type="button"
      onClick={change}
      className="border-line hover:border-spruce inline-flex min-h-11 items-center gap-2 border px-3"
    >
      <svg
        viewBox="0 0 20 20"
        aria-hidden="true"
        className="size-4"
        fill="none"
        stroke="currentColor"
        strokeWidth="1.5"
      >
        {other === 'night' ? (
          <path d="M13 3a7 7 0 1 0 4 10A6 6 0 0 1 13 3Z" />
        ) : (
          <path d="M3 13h14M6 13a4 4 0 0 1 8 0M10 4v2M4 7l1.4 1.4M16 7l-1.4 1.4" />
        )}
      </svg>
      {other === 'night' ? 'Night' : 'Day'}
      <span className="sr-only"> theme</span>
    </button>
  );
}
