import { describe, expect, it } from 'vitest';
import { signedDeg } from '@/lib/geo/angles';
import { dot, vectorToward } from '@/lib/geo/vector';
import { makeGood } from '@/lib/passages/make-good';
import type { Boat } from '@/lib/passages/passage';
import { windOverWater } from '@/lib/passages/wind-over-water';
import { buildCraft } from '../builders/craft';
import published from './current-triangles.json';

interface Triangle {
  readonly trackDeg: number;
  readonly speedKn: number;
  readonly setDeg: number;
  readonly driftKn: number;
}

/** A boat of one speed at every angle: then the heading that makes good the track is the plain triangle. */
function solve({ trackDeg, speedKn, setDeg, driftKn }: Triangle) {
  const speeds = [speedKn, speedKn];
  const polar = { windSpeedsKn: [1, 40], windAnglesDeg: [0, 180], speedsKn: [speeds, speeds] };
  const boat: Boat = { ...buildCraft(), polar, leewayDeg: 0, shunt: { seconds: 60, driftKn: 1 } };
  const course = makeGood(trackDeg, {
    boat,
    reef: { name: 'full', areaM2: 10, centreHeightM: 2, speedFactor: 1 },
    wind: { fromDeg: 0, meanKn: 10, gustKn: vectorToward(180, 13) },
    streamKn: vectorToward(setDeg, driftKn),
  });
  return (
    course && {
      steerDeg: course.headingDeg,
      madeGoodKn: dot(vectorToward(trackDeg, 1), course.overGroundKn),
    }
  );
}

describe(`current triangles: ${published.plotted.source}`, () => {
  it.each(published.plotted.rows)('track $trackDeg° at $speedKn kn, set $setDeg° drift $driftKn kn', (row) => {
    const answer = solve(row);
    expect(answer).not.toBeNull();
    const { tolerance } = published.plotted;
    expect(Math.abs(signedDeg(answer!.steerDeg - row.steerDeg))).toBeLessThanOrEqual(tolerance.steerDeg);
    expect(Math.abs(answer!.madeGoodKn - row.madeGoodKn)).toBeLessThanOrEqual(tolerance.madeGoodKn);
  });
});

describe('current triangles, own worked examples', () => {
  it(published.exact.title, () => {
    const answer = solve(published.exact)!;
    expect(Math.abs(answer.steerDeg - published.exact.steerDeg)).toBeLessThan(published.exact.tolerance);
    expect(Math.abs(answer.madeGoodKn - published.exact.madeGoodKn)).toBeLessThan(published.exact.tolerance);
  });

  it(published.tooStrong.title, () => {
    expect(solve(published.tooStrong)).toBeNull();
  });

  it(`${published.windOverWater.title}: ${published.windOverWater.note}`, () => {
    const { wind, stream, fromDeg, kn, tolerance } = published.windOverWater;
    const boat = buildCraft();
    const left = windOverWater(
      {
        wind: { fromDeg: wind.fromDeg, meanKn: wind.kn, gustKn: wind.kn },
        streamKn: vectorToward(stream.towardDeg, stream.kn),
      },
      boat.reefs[0]!,
      boat,
    );
    expect(Math.abs(left.fromDeg - fromDeg)).toBeLessThan(tolerance);
    expect(Math.abs(left.meanKn - kn)).toBeLessThan(tolerance);
  });
});
