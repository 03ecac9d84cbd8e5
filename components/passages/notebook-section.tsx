import { useId, type ReactNode } from 'react';

/** One section of the notebook's page: a heading over a pencil rule. */
export function NotebookSection({
  title,
  anchor,
  aside,
  children,
}: {
  readonly title: string;
  /** Where a link on the page may lead. */
  readonly anchor?: string;
  readonly aside?: ReactNode;
  readonly children: ReactNode;
}) {
  const id = useId();
  return (
    <section id={anchor} aria-labelledby={id} className="min-w-0 scroll-mt-24">
      <div className="border-spruce mb-3 flex flex-wrap items-baseline justify-between gap-2 border-b pb-1">
        <h3 id={id} className="text-lg font-bold">
          {title}
        </h3>
        {aside}
      </div>
      {children}
    </section>
  );
}
