'use client';

import { useMemo, useReducer, useState } from 'react';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import type { PlanDraft } from './plan-draft';
import { readPlan } from './plan-from-draft';
import { isUnsaved, planReducer, startPlanState } from './plan-state';
import type { PlannerForm } from './planner-context';
import { useCheck } from './use-check';
import { useSave } from './use-save';
import { useUnsavedWarning } from './use-unsaved-warning';

interface PlannerStart {
  readonly passageId: string;
  readonly revision: number;
  readonly draft: PlanDraft;
  readonly sheet: BoatSheet;
}

/** The planner's state, its check and its saving, put together. */
export function usePlanner({ passageId, revision, draft: first, sheet }: PlannerStart) {
  const [state, dispatch] = useReducer(planReducer, first, startPlanState);
  const [triedToSave, setTriedToSave] = useState(false);
  const draft = state.present;
  const reading = useMemo(() => readPlan(draft), [draft]);
  const saving = useSave(passageId, revision, dispatch);
  const check = useCheck(reading.plan, sheet);
  const unsaved = isUnsaved(state);
  useUnsavedWarning(unsaved || saving.busy);

  const serverProblems =
    saving.outcome?.kind === 'fields' && saving.answeredFor === draft ? saving.outcome.problems : null;
  const form: PlannerForm = {
    draft,
    reading,
    dispatch,
    problemAt: (pointer) => {
      const own = reading.problems.get(pointer);
      // What is only empty is no fault until somebody wants to save it.
      if (own !== undefined && (triedToSave || !reading.missing.has(pointer))) return own;
      return serverProblems?.get(pointer);
    },
  };
  const save = () => {
    setTriedToSave(true);
    if (reading.plan) void saving.save(draft, reading.plan);
  };
  const saveOver = () => {
    if (reading.plan) void saving.saveOver(draft, reading.plan);
  };
  return { state, form, check, saving, unsaved, save, saveOver, triedToSave };
}

export type Planner = ReturnType<typeof usePlanner>;
