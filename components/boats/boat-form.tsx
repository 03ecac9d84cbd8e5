'use client';

import { useRouter } from 'next/navigation';
import { useEffect, useRef, useState } from 'react';
import { FormProvider } from 'react-hook-form';
import { useUnsavedWarning } from '@/components/passages/use-unsaved-warning';
import { Button, ButtonLink } from '@/components/ui/button';
import { Panel } from '@/components/ui/panel';
import { useReady } from '@/components/ui/use-ready';
import { ErrorSummary } from './error-summary';
import { TextAreaField, TextField } from './form-fields';
import { HabitsSection } from './habits-section';
import { listProblems } from './list-problems';
import { LiveFigures } from './live-figures';
import { MassesSection } from './masses-section';
import { MeasuresSection } from './measures-section';
import { PolarSection } from './polar-section';
import { nameRows } from './name-rows';
import { ReefsSection } from './reefs-section';
import type { SaveBoat } from './save-boat';
import { SaveNotice } from './save-notice';
import type { SheetForm } from './sheet-form';
import { useSheetForm } from './use-sheet-form';
import { WindSection } from './wind-section';

interface BoatFormProps {
  readonly initial: SheetForm;
  /** Null: a new boat. */
  readonly boatId: string | null;
  readonly basedOnNumber: number | null;
  save: SaveBoat;
}

/** The boat sheet to be typed in. Saving makes a new version; no version is ever changed. */
export function BoatForm({ initial, boatId, basedOnNumber, save }: BoatFormProps) {
  const router = useRouter();
  const [saved, setSaved] = useState(false);
  const { form, answer, tries, submit, saveOver } = useSheetForm({
    initial,
    boatId,
    basedOnNumber,
    save,
    onSaved: (id, number) => {
      setSaved(true);
      router.push(`/boats/${id}?saved=${number}`);
    },
  });
  const { errors, isDirty, isSubmitting } = form.formState;
  useUnsavedWarning(isDirty && !saved);
  const problems = nameRows(listProblems(errors), form.getValues('sheet'));
  const ready = useReady();
  const summary = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (tries > 0) summary.current?.focus();
  }, [tries]);
  return (
    <FormProvider {...form}>
      <form noValidate onSubmit={(event) => void submit(event)} className="space-y-6">
        {tries > 0 && problems.length > 0 && <ErrorSummary ref={summary} problems={problems} />}
        {answer && <SaveNotice answer={answer} boatId={boatId} saveOver={saveOver} />}
        <fieldset disabled={!ready} className="min-w-0 space-y-6">
          <div className="grid items-start gap-6 xl:grid-cols-[minmax(0,1fr)_18rem]">
            <div className="min-w-0 space-y-6">
              <Panel title="Name and notes">
                <div className="space-y-4">
                  <TextField name="name" label="Boat name" maxLength={120} className="max-w-md" />
                  <TextAreaField
                    name="sheet.notes"
                    label="Notes"
                    rows={3}
                    hint="How and when she was weighed, what is guessed."
                  />
                </div>
              </Panel>
              <MassesSection />
              <MeasuresSection />
              <WindSection />
              <ReefsSection />
              <PolarSection />
              <HabitsSection />
            </div>
            <aside aria-label="Figures as typed" className="xl:sticky xl:top-4">
              <LiveFigures control={form.control} />
            </aside>
          </div>
          <div className="border-ink bg-panel sticky bottom-0 z-10 flex flex-wrap items-center gap-3 border-t-2 px-4 py-3">
            <Button type="submit" disabled={isSubmitting || saved}>
              {boatId === null ? 'Save the new boat' : `Save as boat sheet ${(basedOnNumber ?? 0) + 1}`}
            </Button>
            <ButtonLink variant="plain" href={boatId === null ? '/boats' : `/boats/${boatId}`}>
              Leave
            </ButtonLink>
            <span role="status" className="text-muted">
              {isSubmitting ? 'Saving…' : saved ? 'Saved' : isDirty ? 'Not saved yet' : 'Nothing changed'}
            </span>
          </div>
        </fieldset>
      </form>
    </FormProvider>
  );
}
