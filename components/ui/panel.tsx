import { useId, type ReactNode } from 'react';

interface PanelProps {
  readonly title?: string;
  readonly actions?: ReactNode;
  readonly className?: string;
  readonly children: ReactNode;
}

/** A square-cut sheet on the ground, with its heading over a ruled line. */
export function Panel({ title, actions, className, children }: PanelProps) {
  const id = useId();
  return (
    <section
      aria-labelledby={title ? id : undefined}
      className={`border-line bg-panel min-w-0 border p-4 md:p-5 ${className ?? ''}`}
    >
      {title && (
        <div className="border-line mb-4 flex flex-wrap items-baseline justify-between gap-2 border-b pb-2">
          <h2 id={id} className="text-lg font-bold">
            {title}
          </h2>
          {actions}
        </div>
      )}
      {children}
    </section>
  );
}
