import { describe, expect, it } from 'vitest';
import { buildLandIndex } from '@/lib/geo/land';
import { checkPassage } from '@/lib/passage-check/check-passage';
import {
  dangersBeside,
  describeFlag,
  describeLegState,
  worstLegIndex,
  type LegScene,
} from '@/lib/passage-check/describe';
import { FLAG_WORDS } from '@/lib/passage-check/flag-words';
import type { Flag } from '@/lib/passages/passage';
import { checkRequestSchema } from '@/lib/schemas/check-request';
import { requestToPassage } from '@/lib/schemas/to-passage';
import { check, completeRequest, DEPARTURE, steadyWind } from '../../builders/check-request';

const [out, turn] = completeRequest().route;
const scene: LegScene = {
  legNumber: 1,
  from: { name: out!.name, lat: out!.lat, lon: out!.lon },
  to: { name: turn!.name, lat: turn!.lat, lon: turn!.lon },
  reefNames: completeRequest().boat.reefs.map((reef) => reef.name),
  zone: 'America/Los_Angeles',
};

describe('flags in words', () => {
  it('say leg, time in the zone, place, wind, load share and reef', () => {
    const request = completeRequest();
    request.wind = steadyWind(180, 34, 46);
    const [leg] = check(request).legs;
    const flag = leg!.flags.find(({ code }) => code === 'beyond-righting-moment')!;
    const { sentence, remedy } = describeFlag(flag, scene);
    expect(sentence).toMatch(/^Leg 1, 09:\d\d, /);
    expect(sentence).toContain('gust 46 kn gives');
    expect(sentence).toContain(`${leg!.largestLoadShare!.toFixed(2)} × her righting moment with “second”`);
    expect(remedy.length).toBeGreaterThan(20);
    expect(describeLegState(leg!, scene)).toBe(sentence);
  });

  it('exist for every code, without a number left open', () => {
    for (const code of Object.keys(FLAG_WORDS) as Flag['code'][]) {
      const flag: Flag = { code, severity: 'danger', at: null, lat: null, lon: null, numbers: {} };
      expect(describeFlag(flag, scene).sentence).toMatch(/^Leg 1: .+\.$/);
      expect(FLAG_WORDS[code].remedy).not.toMatch(/\bgo\b|safe/i);
    }
  });
});

describe('a calm state', () => {
  it('does not hide land on the track', () => {
    const box = { west: -123.5, east: -123, south: 48.1, north: 48.5 };
    const island: [number, number][] = [
      [-123.25, 48.29],
      [-123.2, 48.29],
      [-123.2, 48.31],
      [-123.25, 48.31],
      [-123.25, 48.29],
    ];
    const passage = requestToPassage(checkRequestSchema.parse(completeRequest()), DEPARTURE);
    const result = checkPassage(passage, { land: buildLandIndex([[island]], box) });
    expect(result.state).toBe('within');
    const flag = result.legs[0]!.flags.find(({ code }) => code === 'land-on-track')!;
    expect(flag.lon).toBeCloseTo(-123.25, 3);
    // 0.05° of longitude of the leg's 0.15°, at the speed of the leg.
    const share = (Date.parse(flag.at!) - DEPARTURE) / (Date.parse(result.legs[0]!.end!) - DEPARTURE);
    expect(share).toBeCloseTo(0.05 / 0.1497742, 2);
    expect(dangersBeside(result.legs, () => scene)[0]).toContain('the track meets land');
  });
});

describe('the worst leg', () => {
  it('is found by state, then by load share', () => {
    const leg = (state: 'within' | 'thin' | 'beyond' | 'unknown', largestLoadShare: number | null) => ({
      state,
      largestLoadShare,
    });
    expect(worstLegIndex([])).toBeNull();
    expect(worstLegIndex([leg('thin', 0.9), leg('unknown', null), leg('within', 0.3)])).toBe(1);
    expect(worstLegIndex([leg('thin', 0.7), leg('thin', 0.9)])).toBe(1);
    expect(worstLegIndex([leg('unknown', null), leg('beyond', 1.1)])).toBe(1);
  });
});
