import type { ReactNode } from 'react';

/** A page that says what went wrong and what to do next. */
export function DeadEnd({ title, children }: { readonly title: string; readonly children: ReactNode }) {
  return (
    <main id="content" tabIndex={-1} className="mx-auto max-w-2xl px-4 py-16 outline-none">
      <h1 className="border-ink mb-5 border-b-2 pb-3 text-3xl font-bold">{title}</h1>
      {children}
    </main>
  );
}
