'use client';

import { useEffect, useRef, useState } from 'react';
import { useForm, type FieldPath } from 'react-hook-form';
import { formToSheet } from './form-to-sheet';
import { pathOfPointer } from './list-problems';
import { resolveSheetForm } from './resolve-sheet-form';
import type { SaveBoat, SaveBoatAnswer } from './save-boat';
import type { SheetForm } from './sheet-form';

interface SheetFormOptions {
  readonly initial: SheetForm;
  readonly boatId: string | null;
  readonly basedOnNumber: number | null;
  save: SaveBoat;
  onSaved(boatId: string, number: number): void;
}

const UNREACHED: SaveBoatAnswer = {
  kind: 'refused',
  message: 'The server could not be reached. Look to your connection and save again.',
};
const RECHECK_MS = 300;

/** The edit form's state and its saving. Whatever the server answers, what was typed stays. */
export function useSheetForm({ initial, boatId, basedOnNumber, save, onSaved }: SheetFormOptions) {
  const form = useForm<SheetForm>({
    defaultValues: initial,
    resolver: resolveSheetForm,
    mode: 'onBlur',
    // The summary takes the focus: it names them all.
    shouldFocusError: false,
  });
  const [answer, setAnswer] = useState<SaveBoatAnswer | null>(null);
  const [tries, setTries] = useState(0);
  useRecheck(form);

  const send = async (typed: SheetForm, basedOn: number | null) => {
    setAnswer(null);
    const sheet = formToSheet(typed.sheet);
    const got = await save({ boatId, basedOnNumber: basedOn, name: typed.name, sheet }).catch(() => UNREACHED);
    if (got.kind === 'fields') {
      for (const { pointer, message } of got.problems) {
        form.setError(pathOfPointer(pointer) as FieldPath<SheetForm>, { type: 'server', message });
      }
    }
    setAnswer(got);
    setTries((before) => before + 1);
    if (got.kind === 'saved') onSaved(got.boatId, got.number);
  };
  const submit = (basedOn: number | null) =>
    form.handleSubmit(
      // The resolver's output is the form as typed; what is sent is made of it.
      (typed) => send(typed, basedOn),
      () => setTries((before) => before + 1),
    );
  return {
    form,
    answer,
    /** Counts tries that ended, so that the summary can take the focus each time. */
    tries,
    submit: submit(basedOnNumber),
    saveOver: (newestNumber: number) => void submit(newestNumber)(),
  };
}

/** Once a save was tried, messages follow the typing, those that several fields share too. */
function useRecheck({ subscribe, trigger, formState }: ReturnType<typeof useForm<SheetForm>>): void {
  const { isSubmitted } = formState;
  const timer = useRef<ReturnType<typeof setTimeout>>(undefined);
  useEffect(() => {
    if (!isSubmitted) return;
    const stop = subscribe({
      formState: { values: true },
      callback: () => {
        clearTimeout(timer.current);
        timer.current = setTimeout(() => void trigger(), RECHECK_MS);
      },
    });
    return () => {
      stop();
      clearTimeout(timer.current);
    };
  }, [isSubmitted, subscribe, trigger]);
}
