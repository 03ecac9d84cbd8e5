import { describe, expect, it } from 'vitest';
import { checkRequestSchema } from '@/lib/schemas/check-request';
import { toInvalidInput } from '@/lib/schemas/to-field-problems';
import { completeRequest } from '../../builders/check-request';

/** Spoils a request in ways its type forbids. */
// eslint-disable-next-line @typescript-eslint/no-explicit-any
type Spoil = (request: any) => void;

function problemsOf(spoil: Spoil) {
  const request = completeRequest();
  spoil(request);
  const parsed = checkRequestSchema.safeParse(request);
  if (parsed.success) return null;
  const { status, fields } = toInvalidInput(parsed.error);
  return { status, pointers: fields.map((field) => field.pointer), messages: fields.map((field) => field.message) };
}

describe('well formed, but impossible: 422 at the field', () => {
  it.each<[string, Spoil, string]>([
    ['a gust under its mean', (r) => (r.wind.rows[0].gustKn = 5), '/wind/rows/0/gustKn'],
    ['a closest angle outside the polar', (r) => (r.boat.closestAngleDeg = 40), '/boat/closestAngleDeg'],
    ['a deepest angle outside the polar', (r) => (r.boat.deepestAngleDeg = 170), '/boat/deepestAngleDeg'],
    ['no righting moment', (r) => r.boat.masses.forEach((m: { yM: number }) => (m.yM = 0)), '/boat/masses'],
    ['an ama to leeward', (r) => (r.boat.masses[0].yM = -0.1), '/boat/masses/0/yM'],
    ['a negative span', (r) => (r.boat.spanM = -2.9), '/boat/spanM'],
    ['a working margin under 1', (r) => (r.boat.workingMargin = 0.9), '/boat/workingMargin'],
    ['two waypoints on one spot', (r) => (r.route[1] = { ...r.route[0], name: 'again' }), '/route/1'],
    ['half a metre written as 500', (r) => (r.boat.vaka.waterplaneBeamM = 500), '/boat/vaka/waterplaneBeamM'],
    ['a wind of 300 kn', (r) => Object.assign(r.wind.rows[0], { meanKn: 300, gustKn: 301 }), '/wind/rows/0/meanKn'],
    ['a latitude of 95°', (r) => (r.route[0].lat = 95), '/route/0/lat'],
    ['a reef table out of order', (r) => r.boat.reefs.reverse(), '/boat/reefs/1/areaM2'],
    ['a ragged polar', (r) => r.boat.polar.speedsKn[1].pop(), '/boat/polar/speedsKn/1'],
    ['rows of wind out of order', (r) => r.wind.rows.reverse(), '/wind/rows/1/time'],
  ])('%s', (_, spoil, pointer) => {
    const problems = problemsOf(spoil);
    expect(problems?.status).toBe(422);
    expect(problems?.pointers).toContain(pointer);
    problems?.messages.forEach((message) => expect(message.length).toBeGreaterThan(20));
  });
});

describe('not well formed: 400 at the field', () => {
  it.each<[string, Spoil, string]>([
    ['no boat', (r) => delete r.boat, '/boat'],
    ['a span in words', (r) => (r.boat.spanM = 'three'), '/boat/spanM'],
    ['an empty reef table', (r) => (r.boat.reefs = []), '/boat/reefs'],
    ['a hole in the polar', (r) => (r.boat.polar.speedsKn[1][2] = null), '/boat/polar/speedsKn/1/2'],
    ['one waypoint', (r) => r.route.pop() && r.route.pop(), '/route'],
    ['a day that does not exist', (r) => (r.departure = '2026-02-30T10:00:00Z'), '/departure'],
    ['a time without its offset', (r) => (r.departure = '2026-06-01T16:00:00'), '/departure'],
    ['both a coefficient and a rule', (r) => (r.boat.pressure.kgPerM2 = 10), '/boat/pressure'],
    ['an unknown kind of wind', (r) => (r.wind.kind = 'magic'), '/wind/kind'],
  ])('%s', (_, spoil, pointer) => {
    const problems = problemsOf(spoil);
    expect(problems?.status).toBe(400);
    expect(problems?.pointers).toContain(pointer);
  });
});

describe('defaults', () => {
  it('fills in the documented ones', () => {
    const request = completeRequest();
    for (const key of ['gustFactor', 'workingMargin', 'windHeightExponent', 'leewayDeg'] as const)
      delete request.boat[key];
    delete request.stream;
    const { boat, stream } = checkRequestSchema.parse(request);
    expect(boat).toMatchObject({ gustFactor: 1.35, workingMargin: 1.5, windHeightExponent: 0, leewayDeg: 0 });
    expect(boat.reefs[0]!.speedFactor).toBe(1);
    expect(stream).toEqual({ kind: 'none' });
  });
});
