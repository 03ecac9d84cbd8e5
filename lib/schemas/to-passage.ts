import type { Boat, Passage } from '@/lib/passages/passage';
import type { BoatSheet } from '@/lib/schemas/boat-sheet';
import type { CheckRequest } from '@/lib/schemas/check-request';
import type { PassagePlan } from '@/lib/schemas/passage-plan';
import type { EpochMs } from '@/lib/units/quantities';

/** A valid request as the engine takes it: instants as numbers. `now` serves where the request has no asOf. */
export function requestToPassage(request: CheckRequest, now: EpochMs): Passage {
  return {
    boat: request.boat as Boat,
    route: request.route,
    wind: {
      ...(request.wind.issuedAt ? { issuedAt: Date.parse(request.wind.issuedAt) } : {}),
      rows: request.wind.rows.map(withEpochTime),
    },
    stream:
      request.stream.kind === 'none'
        ? { kind: 'none' }
        : { kind: 'series', rows: request.stream.rows.map((row) => withEpochTime(row)) },
    departure: Date.parse(request.departure),
    asOf: request.asOf ? Date.parse(request.asOf) : now,
    ...(request.limits ? { limits: request.limits as NonNullable<Passage['limits']> } : {}),
  };
}

/** A saved plan on one boat sheet as the engine takes it. */
export function planToPassage(plan: PassagePlan, sheet: BoatSheet, asOf: EpochMs): Passage {
  return {
    boat: sheet as Boat,
    route: plan.route,
    wind: { issuedAt: Date.parse(plan.wind.issuedAt), rows: plan.wind.rows.map(withEpochTime) },
    stream:
      plan.streamRows.length === 0
        ? { kind: 'none' }
        : { kind: 'series', rows: plan.streamRows.map((row) => withEpochTime(row)) },
    departure: Date.parse(plan.departure),
    asOf,
    limits: plan.limits as NonNullable<Passage['limits']>,
  };
}

function withEpochTime<Row extends { readonly time: string }>(row: Row): Omit<Row, 'time'> & { time: EpochMs } {
  return { ...row, time: Date.parse(row.time) };
}
