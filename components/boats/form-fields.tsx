'use client';

import type { ComponentProps } from 'react';
import { get, useFormContext, type FieldPath } from 'react-hook-form';
import { Checkbox, NumberInput, SelectInput, TextArea, TextInput } from '@/components/ui/field';
import { fieldId } from './list-problems';
import type { SheetForm } from './sheet-form';

export type SheetPath = FieldPath<SheetForm>;
type At<Input extends (...args: never[]) => unknown> = Omit<Parameters<Input>[0], 'id' | 'problem' | 'name' | 'ref'> & {
  readonly name: SheetPath;
};

/** The message at a path, where there is one. */
export function useProblem(path: string): string | undefined {
  const { formState } = useFormContext<SheetForm>();
  const found = get(formState.errors, path) as { message?: string; root?: { message?: string } } | undefined;
  return found?.message ?? found?.root?.message;
}

export function NumberField({ name, ...rest }: At<typeof NumberInput>) {
  const { register } = useFormContext<SheetForm>();
  return (
    <NumberInput
      id={fieldId(name)}
      problem={useProblem(name)}
      {...register(name)}
      {...(rest as object)}
      label={rest.label}
    />
  );
}

export function TextField({ name, ...rest }: At<typeof TextInput>) {
  const { register } = useFormContext<SheetForm>();
  return (
    <TextInput
      id={fieldId(name)}
      problem={useProblem(name)}
      {...register(name)}
      {...(rest as object)}
      label={rest.label}
    />
  );
}

export function TextAreaField({ name, ...rest }: At<typeof TextArea>) {
  const { register } = useFormContext<SheetForm>();
  return (
    <TextArea
      id={fieldId(name)}
      problem={useProblem(name)}
      {...register(name)}
      {...(rest as object)}
      label={rest.label}
    />
  );
}

export function SelectField({ name, ...rest }: At<typeof SelectInput>) {
  const { register } = useFormContext<SheetForm>();
  return (
    <SelectInput
      id={fieldId(name)}
      problem={useProblem(name)}
      {...register(name)}
      {...(rest as object)}
      label={rest.label}
    />
  );
}

export function CheckField({ name, ...rest }: At<typeof Checkbox>) {
  const { register } = useFormContext<SheetForm>();
  return <Checkbox id={fieldId(name)} {...register(name)} {...(rest as object)} label={rest.label} />;
}

interface ChoiceFieldProps {
  readonly name: SheetPath;
  readonly legend: string;
  readonly choices: readonly { readonly value: string; readonly label: string }[];
}

/** One of a few ways, all of them in sight. */
export function ChoiceField({ name, legend, choices }: ChoiceFieldProps) {
  const { register } = useFormContext<SheetForm>();
  return (
    <fieldset className="min-w-0">
      <legend className="font-bold">{legend}</legend>
      <div className="flex flex-wrap gap-x-6">
        {choices.map(({ value, label }) => (
          <label key={value} className="flex min-h-11 items-center gap-3">
            <input type="radio" value={value} className="accent-spruce size-5 shrink-0" {...register(name)} />
            {label}
          </label>
        ))}
      </div>
    </fieldset>
  );
}

/** A message about a whole group, where the error summary's link lands. */
export function GroupProblem({ path }: { readonly path: string } & Pick<ComponentProps<'p'>, 'className'>) {
  const problem = useProblem(path);
  return (
    <div id={fieldId(path)} tabIndex={-1}>
      {problem && (
        <p className="text-beyond mb-3 font-bold" data-testid="field-problem">
          {problem}
        </p>
      )}
    </div>
  );
}
