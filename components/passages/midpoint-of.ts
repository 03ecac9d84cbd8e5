import type { Position } from '@/lib/geo/position';
import { rhumbDirect, rhumbInverse } from '@/lib/geo/rhumb';
import { placeOfWaypoint } from './leg-measures';
import type { PlanDraft } from './plan-draft';

/** Half way along a leg, counted from 0; null where an end is not known. */
export function midpointOf(draft: PlanDraft, legIndex: number): Position | null {
  const from = placeOfWaypoint(draft, legIndex);
  const to = placeOfWaypoint(draft, legIndex + 1);
  if (!from || !to) return null;
  const { courseDeg, distanceM } = rhumbInverse(from, to);
  return rhumbDirect(from, courseDeg, distanceM / 2);
}
