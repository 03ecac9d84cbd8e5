'use client';

import { useId, type InputHTMLAttributes } from 'react';

interface CellInputProps extends Omit<InputHTMLAttributes<HTMLInputElement>, 'value' | 'onChange' | 'id'> {
  readonly label: string;
  readonly value: string;
  onValue: (value: string) => void;
  readonly problem?: string | undefined;
  /** Shown beside the field, and read out with its label. */
  readonly unit?: string;
  readonly hint?: string;
  /** In a table the heading is the visible label. */
  readonly hideLabel?: boolean;
  /** A short visible label for a phone, where the table has no room for headings. */
  readonly phoneLabel?: string;
}

/** A text field that keeps whatever is typed, its unit beside it and its message under it. */
export function CellInput({
  label,
  value,
  onValue,
  problem,
  unit,
  hint,
  hideLabel,
  phoneLabel,
  className,
  ...rest
}: CellInputProps) {
  const id = useId();
  const notes = [problem ? `${id}-problem` : null, hint ? `${id}-hint` : null].filter(Boolean).join(' ');
  return (
    <div className={`min-w-0 ${className ?? ''}`}>
      <label htmlFor={id} className={hideLabel ? 'sr-only' : 'text-muted mb-1 block text-sm'}>
        {label}
        {unit && hideLabel ? `, ${unit}` : ''}
      </label>
      {phoneLabel && (
        <span aria-hidden="true" className="text-muted block text-xs md:hidden">
          {phoneLabel}
        </span>
      )}
      <span className="flex items-center gap-1.5">
        <input
          id={id}
          value={value}
          onChange={(event) => onValue(event.target.value)}
          aria-invalid={problem ? true : undefined}
          aria-describedby={notes || undefined}
          autoComplete="off"
          spellCheck={false}
          className="border-line bg-ground text-ink focus-visible:outline-spruce aria-invalid:border-beyond min-h-10 w-full min-w-0 border px-2 tabular-nums outline-offset-1 focus-visible:outline-2 aria-invalid:border-2"
          {...rest}
        />
        {unit && (
          <span aria-hidden="true" className="text-muted shrink-0 text-sm">
            {unit}
          </span>
        )}
      </span>
      {hint && (
        <p id={`${id}-hint`} className="text-muted mt-1 text-xs">
          {hint}
        </p>
      )}
      {problem && (
        <p id={`${id}-problem`} className="text-beyond mt-1 text-sm" data-testid="field-problem">
          {problem}
        </p>
      )}
    </div>
  );
}
