import type { ReactNode, TdHTMLAttributes, ThHTMLAttributes } from 'react';

interface DataTableProps {
  /** Names the table for those who cannot see what it stands under. */
  readonly caption: string;
  readonly children: ReactNode;
}

/** A ruled table that scrolls sideways in itself where the screen is narrow. */
export function DataTable({ caption, children }: DataTableProps) {
  return (
    <div className="overflow-x-auto" tabIndex={0} role="region" aria-label={caption}>
      <table className="w-full border-collapse text-left">
        <caption className="sr-only">{caption}</caption>
        {children}
      </table>
    </div>
  );
}

export function HeadCell({ className, ...rest }: ThHTMLAttributes<HTMLTableCellElement>) {
  return (
    <th
      scope="col"
      className={`border-ink text-muted border-b px-2 py-2 text-sm font-bold whitespace-nowrap ${className ?? ''}`}
      {...rest}
    />
  );
}

export function Cell({ className, ...rest }: TdHTMLAttributes<HTMLTableCellElement>) {
  return <td className={`border-line border-b px-2 py-2 align-top ${className ?? ''}`} {...rest} />;
}
