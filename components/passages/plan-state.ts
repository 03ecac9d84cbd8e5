import { applyRowAction } from './apply-row-action';
import { applyWaypointAction, isWaypointAction } from './apply-waypoint-action';
import { joinKey, type PlanAction } from './plan-actions';
import type { PlanDraft } from './plan-draft';

/** The planner's whole state: the plan as typed, the steps that can be undone, and what the server has. */
export interface PlanState {
  readonly present: PlanDraft;
  readonly past: readonly PlanDraft[];
  readonly future: readonly PlanDraft[];
  /** The draft last saved; the same object as `present` when nothing is unsaved. */
  readonly saved: PlanDraft;
  readonly lastKey: string | null;
}

export type PlanStateAction =
  | PlanAction
  | { readonly type: 'undo' }
  | { readonly type: 'redo' }
  | { readonly type: 'saved'; readonly draft: PlanDraft };

/** Steps kept for undo: more than a planning session needs, little enough to hold. */
const MOST_STEPS = 200;

export function startPlanState(draft: PlanDraft): PlanState {
  return { present: draft, past: [], future: [], saved: draft, lastKey: null };
}

/** Pure: the next state of the planner. Undo and redo walk whole drafts, so nothing typed can be left half undone. */
export function planReducer(state: PlanState, action: PlanStateAction): PlanState {
  switch (action.type) {
    case 'undo': {
      const before = state.past[state.past.length - 1];
      if (!before) return state;
      return {
        ...state,
        present: before,
        past: state.past.slice(0, -1),
        future: [state.present, ...state.future],
        lastKey: null,
      };
    }
    case 'redo': {
      const [after, ...rest] = state.future;
      if (!after) return state;
      return { ...state, present: after, past: [...state.past, state.present], future: rest, lastKey: null };
    }
    case 'saved':
      return { ...state, saved: action.draft, lastKey: null };
    default:
      return step(state, action);
  }
}

function step(state: PlanState, action: PlanAction): PlanState {
  const next = applyPlanAction(state.present, action);
  if (next === state.present) return state;
  const key = joinKey(action);
  const joins = key !== null && key === state.lastKey && state.past.length > 0;
  return {
    ...state,
    present: next,
    past: joins ? state.past : [...state.past, state.present].slice(-MOST_STEPS),
    future: [],
    lastKey: key,
  };
}

export function applyPlanAction(draft: PlanDraft, action: PlanAction): PlanDraft {
  if (isWaypointAction(action)) return applyWaypointAction(draft, action);
  switch (action.type) {
    case 'setText':
      return { ...draft, [action.field]: action.value };
    case 'setTime':
      return { ...draft, [action.field]: action.value };
    case 'setLimit':
      return { ...draft, limits: { ...draft.limits, [action.field]: action.value } };
    default:
      return applyRowAction(draft, action);
  }
}

export function isUnsaved(state: PlanState): boolean {
  return state.present !== state.saved;
}
