import type { PlanDraft } from './plan-draft';

/** Nothing of the plan but its name, zone and departure has been put in. */
export function isBlank(draft: PlanDraft): boolean {
  return draft.waypoints.length === 0 && draft.windRows.length === 0;
}
