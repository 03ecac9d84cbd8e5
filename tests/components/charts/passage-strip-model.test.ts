import { describe, expect, it } from 'vitest';
import { stripModel } from '@/components/charts/passage-strip-model';
import { readoutAt } from '@/components/charts/passage-strip-readout';
import { placeAt } from '@/components/charts/place-at';
import { buildCheckResult, buildLeg, buildPlan } from '../../builders/check-result';

const at = (clock: string) => Date.parse(`2026-06-01T${clock}:00Z`);

describe('stripModel', () => {
  const model = stripModel(buildCheckResult(), buildPlan(), 1.35);

  it('lays the legs along time from departure to arrival', () => {
    expect([model.startMs, model.endMs]).toEqual([at('16:00'), at('18:00')]);
    expect(model.legs.map((leg) => [leg.startMs, leg.endMs, leg.state])).toEqual([
      [at('16:00'), at('17:00'), 'within'],
      [at('17:00'), at('18:00'), 'beyond'],
    ]);
  });

  it('marks a shunt where the leading end changes', () => {
    expect(model.ends.map((span) => span.end)).toEqual(['B', 'A']);
    expect(model.shunts).toEqual([{ ms: at('17:30'), lat: 48.5, lon: -123.05 }]);
  });

  it('names a reef once, and leaves out a call that only carries on', () => {
    expect(model.calls.map((call) => call.reef)).toEqual(['full sail', 'one panel in']);
  });

  it('samples mean and gust, and no dark by day', () => {
    expect(model.windGaps).toEqual([]);
    const first = model.wind[0]![0]!;
    expect([first.meanKn, first.gustKn]).toEqual([12 + 8 / 6, 16 + 11 / 6].map((value) => expect.closeTo(value, 6)));
    expect(model.dark).toEqual([]);
    expect(model.stream).toBeNull();
  });

  it('shows a gap where the wind ends, and the dark of the night', () => {
    const night = buildPlan({
      departure: '2026-06-02T04:00:00.000Z',
      wind: {
        ...buildPlan().wind,
        rows: [
          { time: '2026-06-02T03:00:00.000Z', fromDeg: 270, meanKn: 10 },
          { time: '2026-06-02T05:00:00.000Z', fromDeg: 270, meanKn: 10 },
        ],
      },
    });
    const track = [
      [-123, 48.6, '2026-06-02T04:00:00.000Z', 'B'],
      [-123, 48.5, '2026-06-02T07:00:00.000Z', 'B'],
    ] as const;
    const leg = buildLeg({ start: track[0][2], end: track[1][2], track });
    const dark = stripModel(buildCheckResult({ legs: [leg] }), night, 1.35);
    expect(dark.windGaps).toHaveLength(1);
    expect(dark.windGaps[0]!.startMs).toBeGreaterThan(Date.parse('2026-06-02T05:00:00Z'));
    // Civil dusk at 48.5 N 123 W on 1 June is about 21:40 local time, 04:40 UTC.
    expect(dark.dark).toHaveLength(1);
    expect(Math.abs(dark.dark[0]!.startMs - Date.parse('2026-06-02T04:42:00Z'))).toBeLessThan(10 * 60_000);
  });

  it('draws nothing of legs that were never reached', () => {
    const never = buildLeg({ start: null, end: null, track: [], state: 'unknown', reefCalls: [] });
    expect(stripModel(buildCheckResult({ legs: [buildLeg(), never] }), buildPlan(), 1.35).legs).toHaveLength(1);
  });
});

describe('placeAt and readoutAt', () => {
  it('finds her between the points of the track', () => {
    expect(placeAt(buildCheckResult().legs, at('16:30'))).toMatchObject({
      lat: expect.closeTo(48.56, 6),
      legIndex: 0,
      end: 'B',
    });
    expect(placeAt(buildCheckResult().legs, at('19:00'))).toBeNull();
  });

  it('says the instant in words, in the passage’s zone', () => {
    expect(readoutAt(buildCheckResult(), buildPlan(), 1.35, at('17:40'))).toBe(
      '10:40 UTC−7 · leg 2 to the narrows (beyond righting moment) · wind from 281° true, mean 16 kn, gust 21 kn · reef called: one panel in · A leads',
    );
  });
});
