'use client';

import { createContext, useContext, type Dispatch } from 'react';
import type { PlanDraft } from './plan-draft';
import type { PlanReading } from './plan-from-draft';
import type { PlanStateAction } from './plan-state';

/** What every part of the planner's form works on. */
export interface PlannerForm {
  readonly draft: PlanDraft;
  readonly reading: PlanReading;
  readonly dispatch: Dispatch<PlanStateAction>;
  /** The message to show at a field of the plan, by its JSON pointer; undefined where there is nothing to say. */
  readonly problemAt: (pointer: string) => string | undefined;
}

const Context = createContext<PlannerForm | null>(null);

export const PlannerFormProvider = Context.Provider;

export function usePlannerForm(): PlannerForm {
  const form = useContext(Context);
  if (!form) throw new Error('Only inside the planner.');
  return form;
}
