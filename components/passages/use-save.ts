'use client';

import { useState, type Dispatch } from 'react';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import type { PlanDraft } from './plan-draft';
import type { PlanStateAction } from './plan-state';
import { readRevision, savePlan, type SaveOutcome } from './save-plan';

export interface Saving {
  readonly busy: boolean;
  readonly outcome: SaveOutcome | null;
  /** The draft that the server's field messages are about: they go stale with the next change. */
  readonly answeredFor: PlanDraft | null;
  save: (draft: PlanDraft, plan: PassagePlan) => Promise<void>;
  /** After a conflict: takes the server's newest revision as known and saves over it. */
  saveOver: (draft: PlanDraft, plan: PassagePlan) => Promise<void>;
}

/** Saves one passage; a conflict or a failure leaves the draft as it is. */
export function useSave(passageId: string, firstRevision: number, dispatch: Dispatch<PlanStateAction>): Saving {
  const [revision, setRevision] = useState(firstRevision);
  const [busy, setBusy] = useState(false);
  const [answer, setAnswer] = useState<{ draft: PlanDraft; outcome: SaveOutcome } | null>(null);

  const send = async (draft: PlanDraft, plan: PassagePlan, basedOn: number) => {
    setBusy(true);
    const outcome = await savePlan(passageId, plan, basedOn);
    if (outcome.kind === 'saved') {
      setRevision(outcome.revision);
      dispatch({ type: 'saved', draft });
    }
    setAnswer({ draft, outcome });
    setBusy(false);
  };
  return {
    busy,
    outcome: answer?.outcome ?? null,
    answeredFor: answer?.draft ?? null,
    save: (draft, plan) => send(draft, plan, revision),
    saveOver: async (draft, plan) => {
      const newest = await readRevision(passageId);
      await send(draft, plan, newest ?? revision);
    },
  };
}
