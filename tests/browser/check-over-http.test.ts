import { readFileSync } from 'node:fs';
import { beforeAll, describe, expect, it } from 'vitest';
import type { CheckResult } from '@/lib/passages/passage';
import type { CheckRequestInput } from '@/lib/schemas/check-request';
import { checkReplySchema } from '@/lib/schemas/check-reply';
import { completeRequest, routeOf, steadyStream, steadyWind } from '@/tests/builders/check-request';
import { baseUrl } from '@/tests/browser/helpers/browser';
import { httpSession } from '@/tests/browser/helpers/http-session';

interface Problem {
  readonly status: number;
  readonly detail?: string;
  readonly errors?: readonly { readonly pointer: string; readonly detail: string }[];
}

let cookie: string;
beforeAll(async () => {
  cookie = await httpSession('crew@example.org');
});

function post(body: BodyInit, headers: Record<string, string> = {}): Promise<Response> {
  return fetch(`${baseUrl}/api/check`, {
    method: 'POST',
    headers: { 'content-type': 'application/json', origin: baseUrl, cookie, ...headers },
    body,
  });
}

async function check(request: CheckRequestInput): Promise<CheckResult> {
  const answer = await post(JSON.stringify(request));
  expect(answer.status).toBe(200);
  return (await answer.json()) as CheckResult;
}

async function refusal(body: BodyInit, headers?: Record<string, string>): Promise<Problem> {
  const answer = await post(body, headers);
  expect(answer.headers.get('content-type')).toContain('application/problem+json');
  const problem = (await answer.json()) as Problem;
  expect(problem.status).toBe(answer.status);
  expect(JSON.stringify(problem)).not.toMatch(/node_modules|\bat [A-Za-z.]+ \(/);
  return problem;
}

const hoursOf = (leg: CheckResult['legs'][number] | undefined) =>
  (Date.parse(leg!.end!) - Date.parse(leg!.start!)) / 3_600_000;

describe('POST /api/check with a session', () => {
  // Source: tests/published/check-expected.json, closed forms worked apart from this project.
  it('answers the complete request with the expected values', async () => {
    const expected = JSON.parse(readFileSync('tests/published/check-expected.json', 'utf8'));
    const result = await check(completeRequest());
    expect(checkReplySchema.safeParse(result).error).toBeUndefined();
    const { tolerance, totals } = expected;
    expect(result.state).toBe(expected.state);
    expect(result.totals.shunts).toBe(totals.shunts);
    expect(Math.abs(result.totals.distanceNmi - totals.distanceNmi)).toBeLessThan(tolerance.distanceNmi);
    expect(Math.abs(result.totals.hours! - totals.hours)).toBeLessThan(tolerance.hours);
    const [out, back] = result.legs;
    expect(out!.reefCalls[0]!.reef).toBe(expected.legs[0].firstReefCall);
    for (const name of ['largestLoadShare', 'heelingMomentNewtonM', 'rightingMomentNewtonM'] as const) {
      expect(Math.abs(out![name]! / expected.legs[0][name] - 1)).toBeLessThan(tolerance.relative);
    }
    expect([out, back].map((leg) => [leg!.leadingEnd, leg!.mode, leg!.shunts])).toEqual([
      ['B', 'direct', 0],
      ['A', 'direct', 1],
    ]);
  });

  // Boards at θ to the wind: D/cos θ sailed in all, D·tan θ of it across, so ceil(across / width) turns; the first
  // board begins in the middle of the corridor, which may add one.
  it('sails D/cos θ dead to windward, inside the corridor', async () => {
    const request = completeRequest();
    request.boat.shunt = { seconds: 0, driftKn: 0 };
    request.boat.leewayDeg = 0;
    const [distanceNmi, halfWidthM] = [6, 1000];
    request.route = routeOf([{ courseDeg: 180, nmi: distanceNmi, halfWidthM }]);
    request.wind = steadyWind(180, 10, 13);
    const [leg] = (await check(request)).legs;
    expect(leg).toMatchObject({ mode: 'boards', leadingEnd: 'both' });
    const cosine = distanceNmi / leg!.sailedNmi!;
    const acrossM = Math.sqrt(1 - cosine ** 2) * leg!.sailedNmi! * 1852;
    const turns = Math.ceil(acrossM / (2 * halfWidthM));
    expect(Math.abs(leg!.shunts - turns)).toBeLessThanOrEqual(1);
    const angles = leg!.track.slice(1).map(([lon, lat], index) => {
      const [lon0, lat0] = leg!.track[index]!;
      return Math.abs((Math.atan2((lon - lon0) * Math.cos((lat * Math.PI) / 180), lat0 - lat) * 180) / Math.PI);
    });
    const theta = (Math.acos(cosine) * 180) / Math.PI;
    for (const angle of angles) expect(Math.abs(angle - theta)).toBeLessThan(0.5);
  });

  it('steers up a stream abeam, 3-4-5', async () => {
    const request = completeRequest();
    request.boat.polar = { windSpeedsKn: [2, 20], windAnglesDeg: [40, 150], speedsKn: [[5, 5], [5, 5]] }; // prettier-ignore
    request.boat.closestAngleDeg = 45;
    request.boat.reefs = [{ name: 'full', areaM2: 8, centreHeightM: 2.5 }];
    request.route = routeOf([{ courseDeg: 90, nmi: 8 }]);
    request.wind = steadyWind(180, 10, 13);
    request.stream = steadyStream(0, 3);
    const [leg] = (await check(request)).legs;
    expect(hoursOf(leg)).toBeCloseTo(2, 3);
    // The wind over the water is 10 kn from the south less the 3 kn that the water goes north.
    const apparentMs = Math.hypot(4, 13 - 3 + 3) * (1852 / 3600);
    expect(leg!.heelingMomentNewtonM! / (0.5 * 1.225 * apparentMs ** 2 * 1.4 * 8 * 2.95)).toBeCloseTo(1, 3);
  });

  it('makes one shunt where the wind goes through the stern', async () => {
    const request = completeRequest();
    request.wind = steadyWind(180, 8);
    request.route = routeOf([{ courseDeg: 60, nmi: 3 }, { courseDeg: 300, nmi: 3 }]); // prettier-ignore
    const { legs } = await check(request);
    expect(legs.map((leg) => [leg.leadingEnd, leg.shunts])).toEqual([
      ['B', 0],
      ['A', 1],
    ]);
  });
});

describe('POST /api/check with what is wrong', () => {
  type Change = (request: CheckRequestInput) => void;
  const impossible: readonly [string, number, string, Change][] = [
    ['0.5 m written as 500', 422, '/boat/spanM', (r) => (r.boat.spanM = 500)],
    [
      'a wind of 300 kn',
      422,
      '/wind/rows/0/meanKn',
      (r) => Object.assign(r.wind.rows[0]!, { meanKn: 300, gustKn: 300 }),
    ],
    [
      'a gust under the mean',
      422,
      '/wind/rows/0/gustKn',
      (r) => Object.assign(r.wind.rows[0]!, { meanKn: 12, gustKn: 9 }),
    ],
    ['a closest angle outside the polar', 422, '/boat/closestAngleDeg', (r) => (r.boat.closestAngleDeg = 5)],
    ['no righting moment', 422, '/boat/masses', (r) => r.boat.masses.forEach((mass) => (mass.yM = 0))],
    ['a margin under 1', 422, '/boat/workingMargin', (r) => (r.boat.workingMargin = 0.9)],
    ['two waypoints on one spot', 422, '/route/1', (r) => Object.assign(r.route[1]!, r.route[0], { name: 'again' })],
    ['a latitude of 91°', 422, '/route/0/lat', (r) => (r.route[0]!.lat = 91)],
    ['an empty reef table', 400, '/boat/reefs', (r) => (r.boat.reefs = [])],
    [
      'a polar with a hole',
      400,
      '/boat/polar/speedsKn/0/0',
      (r) => (r.boat.polar.speedsKn[0]![0] = null as unknown as number),
    ],
    ['a date that is none', 400, '/departure', (r) => (r.departure = '2026-02-30T09:00:00Z')],
    ['a time without an offset', 400, '/departure', (r) => (r.departure = '2026-06-01T09:00:00')],
  ];

  it.each(impossible)('names the field of %s, %i', async (_what, status, pointer, change) => {
    const request = completeRequest();
    change(request);
    const problem = await refusal(JSON.stringify(request));
    expect(problem.status).toBe(status);
    expect(problem.errors?.map((error) => error.pointer)).toContain(pointer);
    expect(problem.errors?.every((error) => error.detail.length > 10)).toBe(true);
  });

  it.each([
    ['half of a JSON text', 400, '{"boat":', {}],
    ['a form', 415, 'boat=1', { 'content-type': 'application/x-www-form-urlencoded' }],
    ['50 MB', 413, ' '.repeat(50_000_000), {}],
  ])('refuses %s, %i', async (_what, status, body, headers) => {
    expect((await refusal(body, headers as Record<string, string>)).status).toBe(status);
  });
});
