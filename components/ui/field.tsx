'use client';

import {
  useId,
  type ComponentProps,
  type InputHTMLAttributes,
  type ReactNode,
  type SelectHTMLAttributes,
  type TextareaHTMLAttributes,
} from 'react';

interface FieldProps {
  /** Of the control, where a link must find it; else one is made. */
  readonly id?: string;
  readonly label: string;
  /** On a wide screen a column's head stands for it: only read out there. */
  readonly underHead?: boolean;
  readonly hint?: ReactNode;
  readonly problem?: string | undefined;
  /** Shown behind the control and read with its label. */
  readonly unit?: string;
  readonly className?: string;
}

const CONTROL =
  'border-line bg-ground text-ink aria-invalid:border-beyond min-h-11 w-full min-w-0 border px-3 py-2 aria-invalid:border-2';

interface ControlIds {
  readonly id: string;
  readonly 'aria-invalid': true | undefined;
  readonly 'aria-describedby': string | undefined;
}

interface FrameProps extends FieldProps {
  children(ids: ControlIds): ReactNode;
}

/** Label, control, hint and message of one field, tied together for eye and ear. */
export function Field({ id: givenId, label, underHead, hint, problem, unit, className, children }: FrameProps) {
  const ownId = useId();
  const id = givenId ?? ownId;
  const described = [problem && `${id}-problem`, hint && `${id}-hint`].filter(Boolean).join(' ');
  return (
    <div className={`min-w-0 ${className ?? ''}`}>
      <label htmlFor={id} className={`mb-1 block font-bold ${underHead ? 'md:sr-only' : ''}`}>
        {label}
        {unit && <span className="sr-only">, {unit}</span>}
      </label>
      <span className="flex items-center gap-2">
        {children({ id, 'aria-invalid': problem ? true : undefined, 'aria-describedby': described || undefined })}
        {unit && (
          <span aria-hidden="true" className={`text-muted shrink-0 ${underHead ? 'md:hidden' : ''}`}>
            {unit}
          </span>
        )}
      </span>
      {problem && (
        <p id={`${id}-problem`} className="text-beyond mt-1" data-testid="field-problem">
          {problem}
        </p>
      )}
      {hint && (
        <p id={`${id}-hint`} className="text-muted mt-1 text-sm">
          {hint}
        </p>
      )}
    </div>
  );
}

type Of<Attributes> = FieldProps & Omit<Attributes, 'id' | 'className'>;

export function TextInput(
  props: Of<InputHTMLAttributes<HTMLInputElement>> & { readonly ref?: ComponentProps<'input'>['ref'] },
) {
  const { id, label, underHead, hint, problem, unit, className, ...rest } = props;
  return (
    <Field {...({ id, label, underHead, hint, problem, unit, className } as FieldProps)}>
      {(ids) => <input {...ids} className={CONTROL} {...rest} />}
    </Field>
  );
}

/** A number kept as typed: `inputMode` brings up the right keys, what is typed stays even where it is no number. */
export function NumberInput(
  props: Of<InputHTMLAttributes<HTMLInputElement>> & { readonly ref?: ComponentProps<'input'>['ref'] },
) {
  return <TextInput inputMode="decimal" autoComplete="off" spellCheck={false} {...props} />;
}

export function TextArea(
  props: Of<TextareaHTMLAttributes<HTMLTextAreaElement>> & { readonly ref?: ComponentProps<'textarea'>['ref'] },
) {
  const { id, label, underHead, hint, problem, unit, className, ...rest } = props;
  return (
    <Field {...({ id, label, underHead, hint, problem, unit, className } as FieldProps)}>
      {(ids) => <textarea {...ids} className={CONTROL} {...rest} />}
    </Field>
  );
}

export function SelectInput(
  props: Of<SelectHTMLAttributes<HTMLSelectElement>> & { readonly ref?: ComponentProps<'select'>['ref'] },
) {
  const { id, label, underHead, hint, problem, unit, className, ...rest } = props;
  return (
    <Field {...({ id, label, underHead, hint, problem, unit, className } as FieldProps)}>
      {(ids) => <select {...ids} className={CONTROL} {...rest} />}
    </Field>
  );
}

export function Checkbox({
  id: givenId,
  label,
  hint,
  ...rest
}: Of<InputHTMLAttributes<HTMLInputElement>> & { readonly ref?: ComponentProps<'input'>['ref'] }) {
  const ownId = useId();
  const id = givenId ?? ownId;
  return (
    <div className="min-w-0">
      <label htmlFor={id} className="flex min-h-11 items-center gap-3">
        <input id={id} type="checkbox" className="accent-spruce size-5 shrink-0" {...rest} />
        <span>{label}</span>
      </label>
      {hint && <p className="text-muted text-sm">{hint}</p>}
    </div>
  );
}
