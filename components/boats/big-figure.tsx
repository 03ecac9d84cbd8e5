import type { ReactNode } from 'react';

interface BigFigureProps {
  readonly what: string;
  readonly children: ReactNode;
  /** The same in another unit, or where it comes from. */
  readonly aside?: ReactNode;
}

/** One of the sheet's main figures, with its name over it. */
export function BigFigure({ what, children, aside }: BigFigureProps) {
  return (
    <div className="min-w-0">
      <dt className="text-muted text-sm">{what}</dt>
      <dd>
        <span className="text-xl font-bold whitespace-nowrap md:text-2xl">{children}</span>
        {aside && <span className="text-muted block text-sm">{aside}</span>}
      </dd>
    </div>
  );
}
