import { degreesText } from './draft-from-plan';
import type { PlanAction } from './plan-actions';
import { USUAL_CORRIDOR_M, type PlanDraft, type WaypointDraft } from './plan-draft';

type WaypointAction = Extract<
  PlanAction,
  {
    type:
      | 'setWaypoint'
      | 'addWaypoint'
      | 'addEmptyWaypoint'
      | 'insertWaypoint'
      | 'moveWaypoint'
      | 'deleteWaypoint'
      | 'shiftWaypoint'
      | 'reverseRoute';
  }
>;

export function isWaypointAction(action: PlanAction): action is WaypointAction {
  return action.type.includes('Waypoint') || action.type === 'reverseRoute';
}

/** Changes of the route. Corridors belong to the leg that ends at their waypoint and move with it. */
export function applyWaypointAction(draft: PlanDraft, action: WaypointAction): PlanDraft {
  const { waypoints } = draft;
  switch (action.type) {
    case 'setWaypoint':
      return mend(draft, action.id, { [action.field]: action.value });
    case 'moveWaypoint':
      return mend(draft, action.id, { lat: degreesText(action.lat), lon: degreesText(action.lon) });
    case 'addWaypoint':
      return insert(draft, waypoints.length, degreesText(action.lat), degreesText(action.lon));
    case 'addEmptyWaypoint':
      return insert(draft, waypoints.length, '', '');
    case 'insertWaypoint':
      return insert(draft, action.legIndex + 1, degreesText(action.lat), degreesText(action.lon));
    case 'deleteWaypoint': {
      const kept = waypoints.filter((waypoint) => waypoint.id !== action.id);
      return kept.length === waypoints.length ? draft : { ...draft, waypoints: kept };
    }
    case 'shiftWaypoint':
      return shift(draft, action.id, action.by);
    case 'reverseRoute':
      return waypoints.length < 2 ? draft : { ...draft, waypoints: reversed(waypoints) };
  }
}

function mend(draft: PlanDraft, id: string, change: Partial<WaypointDraft>): PlanDraft {
  return {
    ...draft,
    waypoints: draft.waypoints.map((waypoint) => (waypoint.id === id ? { ...waypoint, ...change } : waypoint)),
  };
}

function insert(draft: PlanDraft, index: number, lat: string, lon: string): PlanDraft {
  // A leg that is split keeps its room on both halves.
  const corridor = draft.waypoints[index]?.corridor ?? USUAL_CORRIDOR_M;
  const waypoint: WaypointDraft = { id: `n${draft.nextId}`, name: unusedName(draft), lat, lon, corridor };
  return {
    ...draft,
    waypoints: [...draft.waypoints.slice(0, index), waypoint, ...draft.waypoints.slice(index)],
    nextId: draft.nextId + 1,
  };
}

function unusedName(draft: PlanDraft): string {
  const names = new Set(draft.waypoints.map((waypoint) => waypoint.name));
  let number = draft.waypoints.length + 1;
  while (names.has(`Waypoint ${number}`)) number += 1;
  return `Waypoint ${number}`;
}

function shift(draft: PlanDraft, id: string, by: -1 | 1): PlanDraft {
  const from = draft.waypoints.findIndex((waypoint) => waypoint.id === id);
  const to = from + by;
  const moved = draft.waypoints[from];
  const other = draft.waypoints[to];
  if (!moved || !other) return draft;
  const waypoints = [...draft.waypoints];
  waypoints[from] = other;
  waypoints[to] = moved;
  return { ...draft, waypoints };
}

/** The same water sailed the other way: each leg keeps its own corridor. */
function reversed(waypoints: readonly WaypointDraft[]): readonly WaypointDraft[] {
  const backwards = [...waypoints].reverse();
  return backwards.map((waypoint, i) => ({
    ...waypoint,
    corridor: i === 0 ? (waypoints[0]?.corridor ?? USUAL_CORRIDOR_M) : backwards[i - 1]!.corridor,
  }));
}
