import type { ButtonHTMLAttributes } from 'react';

interface SmallButtonProps extends Omit<ButtonHTMLAttributes<HTMLButtonElement>, 'type'> {
  /** The whole of what it does, where the face is only a sign. */
  readonly label?: string;
}

/** A square button for rows of a table: a thumb's width on a phone, quiet on a wide screen. */
export function SmallButton({ label, className, children, ...rest }: SmallButtonProps) {
  return (
    <button
      type="button"
      aria-label={label}
      title={label}
      className={`border-line bg-panel hover:border-spruce inline-flex min-h-11 min-w-11 items-center justify-center border px-2 text-sm disabled:cursor-not-allowed disabled:opacity-40 md:min-h-9 md:min-w-9 ${className ?? ''}`}
      {...rest}
    >
      {children}
    </button>
  );
}
