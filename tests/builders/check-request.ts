import { readFileSync } from 'node:fs';
import { checkPassage } from '@/lib/passage-check/check-passage';
import type { CheckResult } from '@/lib/passages/passage';
import { checkRequestSchema, type CheckRequestInput } from '@/lib/schemas/check-request';
import { requestToPassage } from '@/lib/schemas/to-passage';
import { METRES_PER_NMI } from '@/lib/units/constants';
import { rhumbDirect } from '@/lib/geo/rhumb';

/** The complete request of tests/published: beam reach out and back in a steady wind of 10 kn from the south. */
export function completeRequest(): CheckRequestInput {
  const file = new URL('../published/check-request.json', import.meta.url);
  return JSON.parse(readFileSync(file, 'utf8')) as CheckRequestInput;
}

export const START = { name: 'start', lat: 48.3, lon: -123.3 };
export const DEPARTURE = Date.parse('2026-06-01T16:00:00Z');

/** A route of legs, each a true course and a distance, from START. */
export function routeOf(
  legs: readonly { readonly courseDeg: number; readonly nmi: number; readonly halfWidthM?: number }[],
): CheckRequestInput['route'] {
  const route: CheckRequestInput['route'] = [START];
  for (const { courseDeg, nmi, halfWidthM } of legs) {
    const place = rhumbDirect(route[route.length - 1]!, courseDeg, nmi * METRES_PER_NMI);
    route.push({ ...place, name: `waypoint ${route.length}`, corridorHalfWidthM: halfWidthM ?? 1000 });
  }
  return route;
}

/** The same wind from an hour before departure until `hours` after it. */
export function steadyWind(fromDeg: number, meanKn: number, gustKn?: number, hours = 72): CheckRequestInput['wind'] {
  const row = (time: number) => ({
    time: new Date(time).toISOString(),
    fromDeg,
    meanKn,
    ...(gustKn === undefined ? {} : { gustKn }),
  });
  return {
    kind: 'series',
    issuedAt: new Date(DEPARTURE - 3_600_000).toISOString(),
    rows: [row(DEPARTURE - 3_600_000), row(DEPARTURE + hours * 3_600_000)],
  };
}

export function steadyStream(towardDeg: number, kn: number, hours = 72): CheckRequestInput['stream'] {
  const row = (time: number) => ({ time: new Date(time).toISOString(), towardDeg, kn });
  return { kind: 'series', rows: [row(DEPARTURE - 3_600_000), row(DEPARTURE + hours * 3_600_000)] };
}

/** Checks a request as the server does, at its own asOf or at departure. */
export function check(request: CheckRequestInput): CheckResult {
  return checkPassage(requestToPassage(checkRequestSchema.parse(request), DEPARTURE));
}
