import type { ReactNode } from 'react';

interface PageTitleProps {
  readonly title: string;
  /** A line under it: whose it is, which version. */
  readonly aside?: ReactNode;
  readonly actions?: ReactNode;
}

export function PageTitle({ title, aside, actions }: PageTitleProps) {
  return (
    <header className="border-ink mb-6 flex flex-wrap items-end justify-between gap-x-6 gap-y-3 border-b-2 pb-3">
      <div className="min-w-0">
        <h1 className="text-2xl font-bold break-words md:text-3xl">{title}</h1>
        {aside && <p className="text-muted mt-1">{aside}</p>}
      </div>
      {actions && <div className="flex flex-wrap gap-2">{actions}</div>}
    </header>
  );
}
