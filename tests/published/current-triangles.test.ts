import { describe, expect, it } from 'vitest';
import { signedDeg } from '@/lib/geo/angles';
import { courseToSteer, windOverWater } from '@/lib/geo/current-triangle';
import published from './current-triangles.json';

describe(`current triangles: ${published.plotted.source}`, () => {
  it.each(published.plotted.rows)('track $trackDeg° at $speedKn kn, set $setDeg° drift $driftKn kn', (row) => {
    const answer = courseToSteer(row);
    expect(answer).not.toBeNull();
    const { tolerance } = published.plotted;
    expect(Math.abs(signedDeg(answer!.steerDeg - row.steerDeg))).toBeLessThanOrEqual(tolerance.steerDeg);
    expect(Math.abs(answer!.madeGoodKn - row.madeGoodKn)).toBeLessThanOrEqual(tolerance.madeGoodKn);
  });
});

describe('current triangles, own worked examples', () => {
  it(published.exact.title, () => {
    const answer = courseToSteer(published.exact)!;
    expect(Math.abs(answer.steerDeg - published.exact.steerDeg)).toBeLessThan(published.exact.tolerance);
    expect(Math.abs(answer.madeGoodKn - published.exact.madeGoodKn)).toBeLessThan(published.exact.tolerance);
  });

  it(published.tooStrong.title, () => {
    expect(courseToSteer(published.tooStrong)).toBeNull();
  });

  it(`${published.windOverWater.title}: ${published.windOverWater.note}`, () => {
    const { wind, stream, fromDeg, kn, tolerance } = published.windOverWater;
    const left = windOverWater(wind, stream);
    expect(Math.abs(left.fromDeg - fromDeg)).toBeLessThan(tolerance);
    expect(Math.abs(left.kn - kn)).toBeLessThan(tolerance);
  });
});
