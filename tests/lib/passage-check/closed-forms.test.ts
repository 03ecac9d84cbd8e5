import { describe, expect, it } from 'vitest';
import { check, completeRequest, DEPARTURE, routeOf, steadyStream, steadyWind } from '../../builders/check-request';

const HOUR_MS = 3_600_000;
const hoursOf = (leg: { start: string | null; end: string | null }) =>
  (Date.parse(leg.end!) - Date.parse(leg.start!)) / HOUR_MS;

/** 10 kn of wind is a row of the polar of the complete request; "first" (0.93) is called there. */
const BEAM_KN = 6.6 * 0.93;

describe('steady wind, against closed forms', () => {
  it('a stream abeam turns the heading up and slows her by the triangle', () => {
    const request = completeRequest();
    // A polar flat in angle and wind: the boat's speed does not depend on the heading.
    request.boat.polar = {
      windSpeedsKn: [2, 20],
      windAnglesDeg: [40, 150],
      speedsKn: [
        [5, 5],
        [5, 5],
      ],
    };
    request.boat.closestAngleDeg = 45;
    request.boat.reefs = [{ name: 'full', areaM2: 8, centreHeightM: 2.5 }];
    request.route = routeOf([{ courseDeg: 90, nmi: 8 }]);
    request.wind = steadyWind(180, 10, 13);
    request.stream = steadyStream(0, 3);
    const [leg] = check(request).legs;
    // 3-4-5: 5 kn through the water, 3 kn of stream square to the course, 4 kn made good.
    expect(hoursOf(leg!)).toBeCloseTo(2, 3);
    expect(leg!.sailedNmi).toBeCloseTo(10, 3);
    expect(leg).toMatchObject({ mode: 'direct', shunts: 0, leadingEnd: 'B' });
    // Wind over the water: 10 kn from the south less 3 kn of stream northward.
    const gustOverWaterKn = 13 - 3;
    const heading = { east: 4, north: -3 };
    const apparentMs = Math.hypot(-heading.east, gustOverWaterKn - heading.north) * (1852 / 3600);
    const byHandNm = 0.5 * 1.225 * apparentMs ** 2 * 1.4 * 8 * (2.5 + 0.45);
    expect(leg!.heelingMomentNewtonM! / byHandNm).toBeCloseTo(1, 3);
  });

  it('wind through the stern from one leg to the next is one shunt', () => {
    const request = completeRequest();
    request.wind = steadyWind(180, 8);
    // 060 has the wind 120° on starboard, 300 has it 120° on port.
    request.route = routeOf([
      { courseDeg: 60, nmi: 3 },
      { courseDeg: 300, nmi: 3 },
    ]);
    const result = check(request);
    expect(result.legs.map((leg) => [leg.leadingEnd, leg.shunts, leg.mode])).toEqual([
      ['B', 0, 'direct'],
      ['A', 1, 'direct'],
    ]);
  });

  it('a shunt costs its seconds and lets her drift down the wind', () => {
    const request = completeRequest();
    const [, back] = check(request).legs;
    // The drift leaves her 25 m to leeward, so the way back lies 0.13° higher than a beam reach.
    expect(Math.abs(hoursOf(back!) - (6 / BEAM_KN + 60 / 3600))).toBeLessThan(0.001);
    const [, afterShunt] = back!.track;
    // 60 s at 0.8 kn to the north.
    expect((afterShunt![1] - 48.3) * 60).toBeCloseTo(0.8 / 60, 4);
    expect(back!.sailedNmi).toBeCloseTo(6, 3);
  });

  it('a gap in the stream is not known, never zero', () => {
    const request = completeRequest();
    request.stream = steadyStream(90, 1, 0.5);
    const result = check(request);
    expect(result.legs[0]).toMatchObject({ state: 'unknown', end: null });
    expect(result.legs[0]!.flags.map((flag) => flag.code)).toContain('stream-not-known');
    expect(result.totals).toMatchObject({ arrival: null, hours: null });
  });

  it('leeway turns the water track off the wind, and the heading up by as much', () => {
    const request = completeRequest();
    request.boat.leewayDeg = 8;
    request.boat.polar = {
      windSpeedsKn: [2, 20],
      windAnglesDeg: [40, 150],
      speedsKn: [
        [4, 6],
        [4, 6],
      ],
    };
    request.boat.closestAngleDeg = 45;
    request.boat.reefs = [{ name: 'full', areaM2: 8, centreHeightM: 2.5 }];
    request.route = routeOf([{ courseDeg: 90, nmi: 5 }]);
    request.wind = steadyWind(180, 10, 13);
    const [leg] = check(request).legs;
    // On the course 090 the wind is 90° off the track, so 82° off the heading: 4 + 2·(82 − 40)/110 kn.
    expect(hoursOf(leg!)).toBeCloseTo(5 / (4 + (2 * 42) / 110), 3);
  });

  it('takes the wind at the height of the centre of effort where the owner turns that on', () => {
    const request = completeRequest();
    request.boat.windHeightExponent = 0.11;
    request.boat.polar = {
      windSpeedsKn: [2, 20],
      windAnglesDeg: [40, 150],
      speedsKn: [
        [5, 5],
        [5, 5],
      ],
    };
    request.boat.reefs = [{ name: 'full', areaM2: 8, centreHeightM: 3 }];
    request.route = routeOf([{ courseDeg: 90, nmi: 5 }]);
    request.wind = steadyWind(180, 10, 13);
    const [leg] = check(request).legs;
    const apparentMs = Math.hypot(5, 13 * 0.3 ** 0.11) * (1852 / 3600);
    expect(leg!.heelingMomentNewtonM! / (0.5 * 1.225 * apparentMs ** 2 * 1.4 * 8 * 3.45)).toBeCloseTo(1, 4);
  });

  it('over 120° counts beam-on at rest, and shows both', () => {
    const request = completeRequest();
    request.route = routeOf([{ courseDeg: 40, nmi: 4 }]);
    request.wind = steadyWind(180, 12, 16);
    const [leg] = check(request).legs;
    const gustMs = 16 * (1852 / 3600);
    const called = request.boat.reefs.find((reef) => reef.name === leg!.reefCalls[0]!.reef)!;
    const atRestNm = 0.5 * 1.225 * gustMs ** 2 * 1.4 * called.areaM2 * (called.centreHeightM + 0.45);
    expect(leg!.largestLoadShareAtRest).toBeCloseTo(atRestNm / leg!.rightingMomentNewtonM!, 6);
    expect(leg!.heelingMomentNewtonM).toBeCloseTo(atRestNm, 3);
    expect(leg!.largestLoadShare).toBe(leg!.largestLoadShareAtRest);
  });
});

describe('a wind that rises, against closed forms', () => {
  /** Mean 10 to 16 kn, gust 13 to 22 kn in six hours from the south, against 1.2 kn of stream. */
  function rising(nmi: number) {
    const request = completeRequest();
    request.route = routeOf([{ courseDeg: 45, nmi }]);
    request.wind.rows = [
      { time: new Date(DEPARTURE).toISOString(), fromDeg: 180, meanKn: 10, gustKn: 13 },
      { time: new Date(DEPARTURE + 6 * HOUR_MS).toISOString(), fromDeg: 180, meanKn: 16, gustKn: 22 },
    ];
    request.stream = steadyStream(180, 1.2);
    return check(request).legs[0]!;
  }

  // Beam-on at rest: 1.5 × ½·1.225·1.4·(V·1852/3600)²·10.4·(2.5 + 0.45) = 3197.95 N·m at V = 17.4986 kn over the
  // water, 16.2986 over the ground, so (16.2986 − 13) / 9 of six hours after the departure.
  const neededAfterMin = ((16.2986 - 13) / 9) * 360;

  it('asks for the deeper reef to the minute, and calls it a quarter of an hour before', () => {
    const calls = rising(14).reefCalls;
    expect(calls.map((call) => call.reef)).toEqual(['first', 'second']);
    expect(Math.abs((Date.parse(calls[1]!.by) - DEPARTURE) / 60_000 - neededAfterMin)).toBeLessThan(0.05);
    expect(Date.parse(calls[1]!.by) - Date.parse(calls[1]!.at)).toBe(15 * 60_000);
    expect(calls[1]!.gustKn).toBeCloseTo(16.2986, 2);
  });

  it('finds it also in the last minute before the waypoint', () => {
    // 12 nmi end 0.6 min after the need; the load share has just reached 1/1.5 then.
    const leg = rising(12);
    const endsAfterMin = (Date.parse(leg.end!) - DEPARTURE) / 60_000;
    expect(endsAfterMin).toBeGreaterThan(neededAfterMin);
    expect(endsAfterMin).toBeLessThan(neededAfterMin + 1);
    expect(leg.reefCalls.map((call) => call.reef)).toEqual(['first', 'second']);
    expect(leg.largestLoadShare).toBeCloseTo(1 / 1.5, 3);
  });
});

describe('what is not known', () => {
  it('says so from where the wind ends, for the leg and all after it', () => {
    const request = completeRequest();
    request.wind = steadyWind(180, 10, 13, 0.5);
    const result = check(request);
    expect(result.state).toBe('unknown');
    expect(result.legs.map((leg) => leg.state)).toEqual(['unknown', 'unknown']);
    expect(result.legs[0]).toMatchObject({ start: '2026-06-01T16:00:00.000Z', end: null });
    const ends = result.legs[0]!.flags.find((flag) => flag.code === 'forecast-over')!;
    expect(ends.at).toBe('2026-06-01T16:30:00.000Z');
    expect(result.legs[1]).toMatchObject({ start: null, end: null, heelingMomentNewtonM: null, leadingEnd: null });
    expect(result.legs[1]!.flags.map((flag) => flag.code)).toContain('forecast-over');
    expect(result.totals).toMatchObject({ arrival: null, hours: null });
  });

  it('before the first row there is no wind', () => {
    const request = completeRequest();
    request.departure = '2026-06-01T14:00:00Z';
    const [leg] = check(request).legs;
    expect(leg).toMatchObject({ state: 'unknown', largestLoadShare: null, mode: null });
    expect(leg!.flags.map((flag) => flag.code)).toContain('wind-not-known');
  });

  it('between rows over 90° apart there is none either', () => {
    const request = completeRequest();
    request.wind.rows[1] = { ...request.wind.rows[1]!, fromDeg: 275 };
    expect(check(request).legs[0]!.flags.map((flag) => flag.code)).toContain('wind-not-known');
    request.wind.rows[1] = { ...request.wind.rows[1]!, fromDeg: 265 };
    expect(check(request).legs[0]!.flags.map((flag) => flag.code)).not.toContain('wind-not-known');
  });

  it('a forecast over twelve hours old turns within into not known, and leaves beyond', () => {
    const request = completeRequest();
    request.asOf = new Date(Date.parse(request.wind.issuedAt!) + 12 * HOUR_MS).toISOString();
    expect(check(request).state).toBe('within');
    request.asOf = new Date(Date.parse(request.wind.issuedAt!) + 12.1 * HOUR_MS).toISOString();
    expect(check(request).state).toBe('unknown');
    request.wind.rows.forEach((row) => Object.assign(row, { meanKn: 40, gustKn: 60 }));
    expect(check(request).state).toBe('beyond');
  });

  it('a corridor too narrow for shunting has no room', () => {
    const request = completeRequest();
    request.route = routeOf([{ courseDeg: 180, nmi: 3, halfWidthM: 60 }]);
    const [leg] = check(request).legs;
    expect(leg!.state).toBe('unknown');
    expect(leg!.flags.map((flag) => flag.code)).toContain('no-room');
  });

  it('a calm is drifted through, and given up after six hours', () => {
    const request = completeRequest();
    request.wind = steadyWind(180, 0, 0);
    const [leg] = check(request).legs;
    expect(leg!.state).toBe('unknown');
    const codes = leg!.flags.map((flag) => flag.code);
    expect(codes).toEqual(expect.arrayContaining(['cannot-be-sailed', 'never-reached']));
    const given = leg!.flags.find((flag) => flag.code === 'never-reached')!;
    expect(Date.parse(given.at!) - DEPARTURE).toBe(6 * HOUR_MS);
  });

  it('without the measures for a curve the state rests on the load share, with a flag', () => {
    const request = completeRequest();
    delete request.boat.vaka;
    const [leg] = check(request).legs;
    expect(leg).toMatchObject({ state: 'within', heelDeg: null });
    expect(leg!.flags.map((flag) => flag.code)).toContain('no-curve');
  });
});

describe('the four states', () => {
  it.each([
    [10, 13, 'within'],
    [18, 26, 'thin'],
    [34, 46, 'beyond'],
  ] as const)('%i kn with gusts of %i kn on the beam: %s', (meanKn, gustKn, state) => {
    const request = completeRequest();
    request.wind = steadyWind(180, meanKn, gustKn);
    expect(check(request).legs[0]!.state).toBe(state);
  });

  it('a carry-up-to exceeded with the least sail is little margin', () => {
    const request = completeRequest();
    request.boat.reefs = [{ name: 'only', areaM2: 4, centreHeightM: 2, carryUpToMeanKn: 9 }];
    const [leg] = check(request).legs;
    expect(leg!.state).toBe('thin');
    expect(leg!.flags.map((flag) => flag.code)).toContain('carry-up-to-exceeded');
  });
});
