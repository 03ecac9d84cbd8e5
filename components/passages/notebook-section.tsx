import { useId, type ReactNode } from 'react';

/** One section of the notebook's page: a heading over a pencil rule. */
export function NotebookSection({
  title,
  aside,
  children,
}: {
  readonly title: string;
  readonly aside?: ReactNode;
  readonly children: ReactNode;
}) {
  const id = useId();
  return (
    <section aria-labelledby={id} className="min-w-0">
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
