import type { PassagePlan } from '@/lib/schemas/passage-plan';
import { emptyDraft, USUAL_CORRIDOR_M, type LimitsDraft, type PlanDraft } from './plan-draft';
import { isZone } from './plan-from-draft';
import { timeToDraft } from './read-time';

const numberText = (value: number | undefined | null) => (value === undefined || value === null ? '' : String(value));

/** Degrees as they are shown where the map set them: five decimals, about a metre. */
export function degreesText(degrees: number): string {
  return String(Math.round(degrees * 1e5) / 1e5);
}

/** What was stored, to a tenth of a metre: minutes typed as thirds of a degree would fill the field with digits. */
function storedDegreesText(degrees: number): string {
  return String(Math.round(degrees * 1e6) / 1e6);
}

/** What is saved, as it is typed. Parts a new passage does not have yet stay empty. */
export function draftFromPlan(plan: Partial<PassagePlan> & { readonly name: string }, usualZone: string): PlanDraft {
  const zone = plan.zone && isZone(plan.zone) ? plan.zone : usualZone;
  const time = (instant: string) => timeToDraft(Date.parse(instant), zone);
  const empty = emptyDraft(plan.name, zone);
  let nextId = 1;
  const id = () => `n${nextId++}`;
  const waypoints = (plan.route ?? []).map((waypoint) => ({
    id: id(),
    name: waypoint.name,
    lat: storedDegreesText(waypoint.lat),
    lon: storedDegreesText(waypoint.lon),
    corridor: numberText(waypoint.corridorHalfWidthM) || USUAL_CORRIDOR_M,
  }));
  const windRows = (plan.wind?.rows ?? []).map((row) => ({
    id: id(),
    time: time(row.time),
    from: String(row.fromDeg),
    mean: String(row.meanKn),
    gust: numberText(row.gustKn),
  }));
  const streamRows = (plan.streamRows ?? []).map((row) => ({
    id: id(),
    time: time(row.time),
    toward: String(row.towardDeg),
    kn: String(row.kn),
  }));
  return {
    ...empty,
    departure: plan.departure ? time(plan.departure) : empty.departure,
    waypoints,
    windSource: plan.wind?.source ?? '',
    windIssued: plan.wind?.issuedAt ? time(plan.wind.issuedAt) : empty.windIssued,
    windRows,
    streamRows,
    limits: limitsToDraft(plan.limits ?? {}),
    nextId,
  };
}

function limitsToDraft(limits: PassagePlan['limits']): LimitsDraft {
  return {
    meanKn: numberText(limits.meanKn),
    gustKn: numberText(limits.gustKn),
    loadShare: numberText(limits.loadShare),
    shuntsPerHour: numberText(limits.shuntsPerHour),
    hours: numberText(limits.hours),
    afterDark: limits.afterDark === undefined ? '' : limits.afterDark ? 'yes' : 'no',
  };
}
