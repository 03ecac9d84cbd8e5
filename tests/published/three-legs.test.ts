import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { check, completeRequest, DEPARTURE, routeOf } from '../builders/check-request';

/** Source: three-legs.json, computed apart from this project, tolerance 0.002. Wind changes at each waypoint. */
const source = JSON.parse(readFileSync(new URL('./three-legs.json', import.meta.url), 'utf8'));
const limits = JSON.parse(readFileSync(new URL('./reef-limits.json', import.meta.url), 'utf8'));
const HOUR_MS = 3_600_000;

interface SourceLeg {
  readonly courseDeg: number;
  readonly nmi: number;
  readonly fromDeg: number;
  readonly meanKn: number;
  readonly halfWidthNmi: number;
}

function threeLegs() {
  const request = completeRequest();
  const { windSpeedsKn, windAnglesDeg, byAngle } = source.polar;
  const legs: SourceLeg[] = source.legs;
  request.boat = {
    spanM: 2.45,
    masses: limits.massesCrewOut,
    pressure: { coefficient: 1.2 },
    centreOfLateralResistanceM: -0.25,
    gustFactor: 1.23,
    workingMargin: 1.5,
    reefs: limits.reefs,
    polar: {
      windSpeedsKn,
      windAnglesDeg,
      speedsKn: windSpeedsKn.map((_: number, wind: number) => byAngle.map((row: number[]) => row[wind]!)),
    },
    closestAngleDeg: 55,
    deepestAngleDeg: 155,
    shunt: { seconds: 120, driftKn: 0 },
  };
  request.route = routeOf(
    legs.map((leg) => ({ courseDeg: leg.courseDeg, nmi: leg.nmi, halfWidthM: leg.halfWidthNmi * 1852 })),
  );
  let start = DEPARTURE - HOUR_MS;
  let end = DEPARTURE;
  request.wind = {
    kind: 'series',
    issuedAt: new Date(DEPARTURE - HOUR_MS).toISOString(),
    rows: legs.flatMap(({ fromDeg, meanKn }, index) => {
      end += source.expected.hours[index] * HOUR_MS + (index === 2 ? HOUR_MS : 0);
      const rows = [start + 1500, end - 1500].map((time) => ({ time: new Date(time).toISOString(), fromDeg, meanKn }));
      start = end;
      return rows;
    }),
  };
  return check(request);
}

describe('three legs with a beat between', () => {
  const { legs, totals } = threeLegs();
  const hours = legs.map((leg) => (Date.parse(leg.end!) - Date.parse(leg.start!)) / HOUR_MS);

  it('sails the distances in the times', () => {
    source.expected.sailedNmi.forEach((nmi: number, i: number) => expect(legs[i]!.sailedNmi).toBeCloseTo(nmi, 2));
    source.expected.hours.forEach((h: number, i: number) => expect(Math.abs(hours[i]! - h)).toBeLessThan(0.003));
    expect(Math.abs(totals.hours! - source.expected.totalHours)).toBeLessThan(0.003);
  });

  it('shunts where the oracle does', () => {
    expect(legs.map((leg) => leg.shunts)).toEqual(source.expected.shunts);
    expect(totals.shunts).toBe(source.expected.totalShunts);
  });

  it('calls the reefs', () => {
    const called = legs.map((leg) =>
      limits.reefs.findIndex((reef: { name: string }) => reef.name === leg.reefCalls[0]!.reef),
    );
    expect(called.slice(0, 2)).toEqual(source.expected.reefIndex.slice(0, 2));
    // The source takes the course's own apparent wind at 150°; beam-on at rest asks for the next reef.
    expect(called[2]).toBe(source.expected.reefIndex[2] + 1);
  });
});
