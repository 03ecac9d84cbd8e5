import type { Position } from '@/lib/geo/position';
import { rhumbInverse } from '@/lib/geo/rhumb';
import { toMagnetic, variationDeg } from '@/lib/geo/variation';
import type { MagneticDegrees, Metres, TrueDegrees } from '@/lib/units/quantities';
import type { PlanDraft } from './plan-draft';
import { isZone } from './plan-from-draft';
import { readCoordinate } from './read-coordinate';
import { readTime } from './read-time';

export interface LegMeasures {
  readonly trueDeg: TrueDegrees;
  readonly magneticDeg: MagneticDegrees;
  readonly distanceM: Metres;
}

/** Where a typed waypoint lies; null as long as its place cannot be read or is off the chart. */
export function placeOfWaypoint(draft: PlanDraft, index: number): Position | null {
  const waypoint = draft.waypoints[index];
  if (!waypoint) return null;
  const lat = readCoordinate(waypoint.lat, 'lat');
  const lon = readCoordinate(waypoint.lon, 'lon');
  if (!('value' in lat) || !('value' in lon) || Math.abs(lat.value) > 85 || Math.abs(lon.value) > 180) return null;
  return { lat: lat.value, lon: lon.value };
}

/** Course and distance of a leg, counted from 0, by variation at its start on the day of departure. */
export function legMeasures(draft: PlanDraft, legIndex: number): LegMeasures | null {
  const from = placeOfWaypoint(draft, legIndex);
  const to = placeOfWaypoint(draft, legIndex + 1);
  if (!from || !to) return null;
  const { courseDeg, distanceM } = rhumbInverse(from, to);
  const departure = readTime(draft.departure, isZone(draft.zone) ? draft.zone : 'UTC');
  const at = departure.kind === 'instant' ? departure.epochMs : USUAL_DAY_MS;
  return { trueDeg: courseDeg, magneticDeg: toMagnetic(courseDeg, variationDeg(from, at)), distanceM };
}

/** Variation moves a few minutes of arc a year: before a departure is typed, the middle of the model's years serves. */
const USUAL_DAY_MS = Date.UTC(2027, 0, 1);
