import { describe, expect, it } from 'vitest';
import { check, completeRequest, routeOf, steadyWind } from '../builders/check-request';

/** Dead to windward or aslant, no shunt time, no leeway, no stream: textbook triangles. */
function beat(options: {
  readonly courseDeg: number;
  readonly nmi: number;
  readonly halfWidthM: number;
  readonly fromDeg: number;
  readonly angleDeg: number;
}) {
  const request = completeRequest();
  request.boat.polar = {
    windSpeedsKn: [6, 18],
    windAnglesDeg: [40, 90, 150],
    speedsKn: [
      [4, 5, 4],
      [6, 8, 7],
    ],
  };
  request.boat.closestAngleDeg = options.angleDeg;
  request.boat.shunt = { seconds: 0, driftKn: 0 };
  request.route = routeOf([options]);
  request.wind = steadyWind(options.fromDeg, 10);
  return check(request).legs[0]!;
}

describe('boards in the corridor', () => {
  // Source: worked example C of the check values: 8 nmi dead to windward at 55°, computed apart from this project.
  it.each([
    [9000, 2],
    [3000, 4],
    [1200, 9],
  ])('8 nmi dead to windward at 55° in ± %i m takes %i turns', (halfWidthM, turns) => {
    const leg = beat({ courseDeg: 0, nmi: 8, halfWidthM, fromDeg: 0, angleDeg: 55 });
    expect(leg.shunts).toBe(turns);
    expect(leg.sailedNmi).toBeCloseTo(13.9476, 3);
    expect(leg).toMatchObject({ mode: 'boards', leadingEnd: 'both' });
  });

  // B01: textbook trigonometry, from memory (certain). 10 nmi at 60°: D/cosθ = 20, one turn where the corridor is wide.
  it('sails D/cosθ', () => {
    const leg = beat({ courseDeg: 0, nmi: 10, halfWidthM: 20_000, fromDeg: 0, angleDeg: 60 });
    expect(leg.sailedNmi).toBeCloseTo(20, 3);
    expect(leg.shunts).toBe(1);
  });

  // B02: computed apart from this project. 10 nmi at 55° in ± 1 nmi.
  it('keeps inside one mile to each side', () => {
    const leg = beat({ courseDeg: 0, nmi: 10, halfWidthM: 1852, fromDeg: 0, angleDeg: 55 });
    expect(leg.sailedNmi).toBeCloseTo(17.4345, 3);
    expect(leg.shunts).toBe(8);
  });

  // B03: computed apart from this project. 10 nmi on 040 with the wind from 020 at 55°: boards of 10.2792 and 6.1039.
  it('works an oblique beat by the sine rule', () => {
    const leg = beat({ courseDeg: 40, nmi: 10, halfWidthM: 15_000, fromDeg: 20, angleDeg: 55 });
    // The source is plane; on the ellipsoid 10 nmi of latitude make 0.04 %.
    expect(Math.abs(leg.sailedNmi! - 16.383)).toBeLessThan(0.01);
    expect(leg.shunts).toBe(1);
    const turn = leg.track.findIndex((point, index) => point[3] !== leg.track[index + 1]?.[3]);
    expect(turn).toBeGreaterThan(0);
    expect(leg.track[0]![3]).toBe('A');
  });

  // B05: computed apart from this project. A leg exactly at the closest angle is sailed direct.
  it('sails direct at exactly the closest angle', () => {
    const leg = beat({ courseDeg: 55, nmi: 6, halfWidthM: 500, fromDeg: 0, angleDeg: 55 });
    expect(leg).toMatchObject({ mode: 'direct', shunts: 0, leadingEnd: 'A' });
  });

  // B07: counted by hand from the definition. Wind north, courses 045, 315, 045, 090, 200, 260: three changes of side.
  it('counts a shunt where the wind changes side', () => {
    const request = completeRequest();
    request.boat.polar = {
      windSpeedsKn: [6, 18],
      windAnglesDeg: [30, 90, 170],
      speedsKn: [
        [4, 5, 4],
        [6, 8, 7],
      ],
    };
    request.boat.closestAngleDeg = 30;
    request.boat.deepestAngleDeg = 170;
    request.route = routeOf([45, 315, 45, 90, 200, 260].map((courseDeg) => ({ courseDeg, nmi: 2 })));
    request.wind = steadyWind(0, 10);
    const result = check(request);
    expect(result.legs.map((leg) => leg.shunts)).toEqual([0, 1, 1, 0, 1, 0]);
    expect(result.legs.map((leg) => leg.leadingEnd)).toEqual(['A', 'B', 'A', 'A', 'B', 'B']);
    expect(result.totals.shunts).toBe(3);
  });
});
