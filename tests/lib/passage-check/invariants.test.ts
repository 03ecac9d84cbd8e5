import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { check, completeRequest, DEPARTURE, routeOf, steadyWind } from '../../builders/check-request';

const reefIndexOf = (name: string) => completeRequest().boat.reefs.findIndex((reef) => reef.name === name);

describe('invariants of the check', () => {
  it('more gust never lowers the load share with the reef fixed, boat speed not above the gust', () => {
    const anyCase = fc.tuple(
      fc.integer({ min: 6, max: 18 }),
      fc.double({ min: 0, max: 10, noNaN: true }),
      fc.double({ min: 0, max: 15, noNaN: true }),
      fc.integer({ min: 60, max: 150 }),
    );
    fc.assert(
      fc.property(anyCase, ([meanKn, spread, more, angle]) => {
        const shareAt = (gustKn: number) => {
          const request = completeRequest();
          request.boat.reefs = [{ name: 'only', areaM2: 9, centreHeightM: 2.4, speedFactor: 0.6 }];
          request.route = routeOf([{ courseDeg: 180 + angle, nmi: 1 }]);
          request.wind = steadyWind(180, meanKn, gustKn);
          return check(request).legs[0]!.largestLoadShare!;
        };
        expect(shareAt(meanKn + spread + more)).toBeGreaterThanOrEqual(shareAt(meanKn + spread) - 1e-9);
      }),
      { numRuns: 60 },
    );
  });

  it('more gust never calls less reef', () => {
    const anyCase = fc.tuple(
      fc.integer({ min: 6, max: 20 }),
      fc.double({ min: 0, max: 10, noNaN: true }),
      fc.double({ min: 0, max: 15, noNaN: true }),
      fc.integer({ min: 60, max: 150 }),
    );
    fc.assert(
      fc.property(anyCase, ([meanKn, spread, more, angle]) => {
        const calledAt = (gustKn: number) => {
          const request = completeRequest();
          request.route = routeOf([{ courseDeg: 180 + angle, nmi: 1 }]);
          request.wind = steadyWind(180, meanKn, gustKn);
          return reefIndexOf(check(request).legs[0]!.reefCalls[0]!.reef);
        };
        expect(calledAt(meanKn + spread + more)).toBeGreaterThanOrEqual(calledAt(meanKn + spread));
      }),
      { numRuns: 60 },
    );
  });

  it('direct legs sailed backwards in the wind turned about have the same shunts', () => {
    const directCourse = fc.oneof(fc.integer({ min: 65, max: 140 }), fc.integer({ min: 220, max: 295 }));
    fc.assert(
      fc.property(fc.array(directCourse, { minLength: 2, maxLength: 5 }), (courses) => {
        const shuntsOf = (legs: number[], fromDeg: number) => {
          const request = completeRequest();
          request.boat.shunt = { seconds: 20, driftKn: 0 };
          request.route = routeOf(legs.map((courseDeg) => ({ courseDeg, nmi: 3 })));
          request.wind = steadyWind(fromDeg, 9);
          return check(request).totals.shunts;
        };
        const back = [...courses].reverse().map((course) => (course + 180) % 360);
        expect(shuntsOf(back, 180)).toBe(shuntsOf(courses, 0));
      }),
      { numRuns: 40 },
    );
  });

  it('distance and corridor scaled together keep the turns', () => {
    const anyCase = fc.tuple(
      fc.double({ min: 2, max: 6, noNaN: true }),
      fc.double({ min: 0.08, max: 0.6, noNaN: true }),
      fc.double({ min: 1.2, max: 3, noNaN: true }),
    );
    fc.assert(
      fc.property(anyCase, ([nmi, widthShare, factor]) => {
        const turnsOf = (scale: number) => {
          const request = completeRequest();
          request.boat.shunt = { seconds: 0, driftKn: 0 };
          request.route = routeOf([{ courseDeg: 0, nmi: nmi * scale, halfWidthM: nmi * widthShare * scale * 1852 }]);
          request.wind = steadyWind(0, 10);
          return check(request).totals.shunts;
        };
        const halfWidths = Math.tan((58 * Math.PI) / 180) / 2 / widthShare;
        // A waypoint passed within 25 m is reached: leave out where the last board would be shorter than that.
        fc.pre((halfWidths % 1) * nmi * widthShare * 1852 > 30 && halfWidths % 1 < 0.99);
        expect(turnsOf(factor)).toBe(turnsOf(1));
        expect(turnsOf(1)).toBe(Math.ceil(halfWidths));
      }),
      { numRuns: 40 },
    );
  });

  it('in winds that shift by up to 30° in three hours she is never left at a waypoint that she cannot quite lay', () => {
    const anyWind = fc.tuple(
      fc.integer({ min: 0, max: 359 }),
      fc.array(fc.tuple(fc.integer({ min: -30, max: 30 }), fc.double({ min: 5, max: 18, noNaN: true })), {
        minLength: 20,
        maxLength: 20,
      }),
    );
    fc.assert(
      fc.property(anyWind, ([firstDeg, steps]) => {
        const request = completeRequest();
        request.boat.leewayDeg = 5;
        request.route = routeOf([290, 330, 345, 70].map((courseDeg) => ({ courseDeg, nmi: 6, halfWidthM: 600 })));
        let fromDeg = firstDeg;
        request.wind.rows = steps.map(([shift, meanKn], index) => {
          fromDeg = (fromDeg + shift + 360) % 360;
          return { time: new Date(DEPARTURE + index * 3 * 3_600_000).toISOString(), fromDeg, meanKn };
        });
        const { legs, totals } = check(request);
        expect(legs.flatMap((leg) => leg.flags.map((flag) => flag.code))).not.toContain('no-room');
        expect(totals.arrival).not.toBeNull();
        // Track and legs run on without a gap, in order of time.
        const times = legs.flatMap((leg) => leg.track.map((point) => Date.parse(point[2])));
        expect(times.every((time, index) => index === 0 || time >= times[index - 1]!)).toBe(true);
        legs.slice(1).forEach((leg, index) => expect(leg.start).toBe(legs[index]!.end));
      }),
      { numRuns: 60 },
    );
  });
});
